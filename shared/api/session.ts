import * as z from 'zod';

/** A password somebody chooses: length is what counts (NIST SP 800-63B). */
export const newPasswordSchema = z
  .string()
  .min(12, 'Use at least 12 characters.')
  .max(200, 'Use at most 200 characters.');

/** An e-mail address. */
export const emailSchema = z.email('Give an e-mail address such as name@example.org.').max(254);

/** An address and its password. Neither is held to rules here, so that old ones still work. */
export const signInRequestSchema = z.object({
  email: z.string().min(1, 'Give your e-mail address.').max(254),
  password: z.string().min(1, 'Give your password.').max(200),
});

/** The person who is signed in. */
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

/** The first account of a service, with the code that the server printed. */
export const firstAdministratorRequestSchema = z.object({
  code: z.string().min(1, 'Give the code that the server printed when it started.'),
  name: z.string().trim().min(1, 'Give your name.').max(120),
  email: emailSchema,
  password: newPasswordSchema,
});

/** A new password, with the present one. */
export const passwordChangeRequestSchema = z.object({
  currentPassword: z.string().min(1, 'Give your present password.'),
  newPassword: newPasswordSchema,
});

/** An address that asks for a link to choose a new password. */
export const passwordResetRequestSchema = z.object({ email: emailSchema });

/** A new password, with the token of the link. */
export const passwordResetCompletionSchema = z.object({
  token: z.string().min(1),
  newPassword: newPasswordSchema,
});

/** An address and its password. */
export type SignInRequest = z.infer<typeof signInRequestSchema>;
/** The person who is signed in. */
export type Person = z.infer<typeof personSchema>;
/** What a browser needs to know before and after signing in. */
export type SessionView = z.infer<typeof sessionViewSchema>;
/** The first account of a service, with the code that the server printed. */
export type FirstAdministratorRequest = z.infer<typeof firstAdministratorRequestSchema>;
/** A new password, with the present one. */
export type PasswordChangeRequest = z.infer<typeof passwordChangeRequestSchema>;
/** An address that asks for a link to choose a new password. */
export type PasswordResetRequest = z.infer<typeof passwordResetRequestSchema>;
/** A new password, with the token of the link. */
export type PasswordResetCompletion = z.infer<typeof passwordResetCompletionSchema>;
