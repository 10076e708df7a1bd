import * as z from 'zod';
import { emailSchema } from './session';

export const accountSchema = z.object({
  id: z.string(),
  name: z.string(),
  email: z.string(),
  administrator: z.boolean(),
  disabled: z.boolean(),
  createdAt: z.string(),
  lastSignInAt: z.string().nullable(),
});

export const newAccountRequestSchema = z.object({
  name: z.string().trim().min(1, 'Give a name.').max(120),
  email: emailSchema,
  administrator: z.boolean().default(false),
});

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

export type Account = z.infer<typeof accountSchema>;
export type NewAccountRequest = z.infer<typeof newAccountRequestSchema>;
export type AccountChangeRequest = z.infer<typeof accountChangeRequestSchema>;
export type OutboxMail = z.infer<typeof outboxMailSchema>;
