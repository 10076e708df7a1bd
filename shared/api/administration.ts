import * as z from 'zod';
import { emailSchema } from './session';

/** An account, as administrators see it. */
export const accountSchema = z.object({
  id: z.string(),
  name: z.string(),
  email: z.string(),
  administrator: z.boolean(),
  disabled: z.boolean(),
  createdAt: z.string(),
  lastSignInAt: z.string().nullable(),
});

/** An account to open; its person is invited by mail. */
export const newAccountRequestSchema = z.object({
  name: z.string().trim().min(1, 'Give a name.').max(120),
  email: emailSchema,
  administrator: z.boolean().default(false),
});

/** What changes of an account; what is left out stays. */
export const accountChangeRequestSchema = z.object({
  name: z.string().trim().min(1, 'Give a name.').max(120).optional(),
  administrator: z.boolean().optional(),
  disabled: z.boolean().optional(),
});

/** A mail of the outbox; live links are hidden in `text`. */
export const outboxMailSchema = z.object({
  id: z.string(),
  to: z.string(),
  subject: z.string(),
  text: z.string(),
  sentAt: z.string(),
  delivery: z.enum(['outbox', 'smtp', 'failed']),
});

/** An account, as administrators see it. */
export type Account = z.infer<typeof accountSchema>;
/** An account to open. */
export type NewAccountRequest = z.infer<typeof newAccountRequestSchema>;
/** What changes of an account. */
export type AccountChangeRequest = z.infer<typeof accountChangeRequestSchema>;
/** A mail of the outbox, its live links hidden. */
export type OutboxMail = z.infer<typeof outboxMailSchema>;
