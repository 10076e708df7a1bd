import * as z from 'zod';

/** A password somebody chooses: length is what counts (NIST SP 800-63B). */
export const newPasswordSchema = z
  .string()
  .min(12, 'Use at least 12 characters.')
  .max(200, 'Use at most 200 characters.');

export const emailSchema = z.email('Give an e-mail address such as name@example.org.').max(254);

export const signInRequestSchema = z.object({
  email: z.string().min(1, 'Give your e-mail address.').max(254),
  password: z.string().min(1, 'Give your password.').max(200),
});

export const personSchema = z.object({
  id: z.string(),
  name: z.string(),
  email: z.string(),
  initials: z.string(),
  administrator: z.boolean(),
});

/** What a browser needs to know before and after signing in. */
export const sessionViewSchema = z.object({
  person: personSchema.nullable(),
  firstAdministratorNeeded: z.boolean(),
  /** Documented demonstration accounts; empty unless the database was seeded for demonstration. */
  demonstrationAccounts: z.array(z.object({ email: z.string(), role: z.string() })),
  demonstrationPassword: z.string().nullable(),
});

export const firstAdministratorRequestSchema = z.object({
  code: z.string().min(1, 'Give the code that the server printed when it started.'),
  name: z.string().trim().min(1, 'Give your name.').max(120),
  email: emailSchema,
  password: newPasswordSchema,
});

export const passwordChangeRequestSchema = z.object({
  currentPassword: z.string().min(1, 'Give your present password.'),
  newPassword: newPasswordSchema,
});

export const passwordResetRequestSchema = z.object({ email: emailSchema });

export const passwordResetCompletionSchema = z.object({
  token: z.string().min(1),
  newPassword: newPasswordSchema,
});

export type SignInRequest = z.infer<typeof signInRequestSchema>;
export type Person = z.infer<typeof personSchema>;
export type SessionView = z.infer<typeof sessionViewSchema>;
export type FirstAdministratorRequest = z.infer<typeof firstAdministratorRequestSchema>;
export type PasswordChangeRequest = z.infer<typeof passwordChangeRequestSchema>;
export type PasswordResetRequest = z.infer<typeof passwordResetRequestSchema>;
export type PasswordResetCompletion = z.infer<typeof passwordResetCompletionSchema>;
