import * as z from 'zod';
import type { Dependencies } from '../../dependencies';

const SETTING = 'demonstration';

const demonstrationSchema = z.object({
  accounts: z.array(z.object({ email: z.string(), role: z.string() })),
  password: z.string(),
});

/** The documented accounts of a database that was seeded for demonstration, with their password. */
export interface Demonstration {
  readonly accounts: readonly { readonly email: string; readonly role: string }[];
  readonly password: string;
}

/** The documented accounts, or null where the database was not seeded for demonstration. */
export async function readDemonstration({ database }: Dependencies): Promise<Demonstration | null> {
  const stored = await database.stores.siteSettings.find(SETTING);
  return stored === null ? null : demonstrationSchema.parse(stored);
}

/** Marks the database as seeded for demonstration; the sign-in page shows the accounts then. */
export async function markAsDemonstration(
  { database }: Dependencies,
  demonstration: Demonstration,
): Promise<void> {
  await database.unitOfWork('site', (unit) =>
    database.stores.siteSettings.put(SETTING, demonstration, unit),
  );
}
