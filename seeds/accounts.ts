import type { StudyRole } from '#shared/permissions';

/** A demonstration account; the administrator holds no study. */
export interface DemonstrationAccount {
  readonly name: string;
  readonly email: string;
  readonly role: StudyRole | 'administrator';
}

/** The one documented password of every demonstration account. */
export const DEMONSTRATION_PASSWORD = 'even-handed-demo';

/** One account a role. The people are invented. */
export const DEMONSTRATION_ACCOUNTS: readonly DemonstrationAccount[] = [
  { name: 'Ada Brink', email: 'administrator@evenhand.example', role: 'administrator' },
  { name: 'Lena Torvald', email: 'lead@evenhand.example', role: 'lead' },
  { name: 'Amir Castellan', email: 'analyst@evenhand.example', role: 'analyst' },
  { name: 'Ines Okafor', email: 'writer@evenhand.example', role: 'writer' },
  { name: 'Marguerite Vale', email: 'editor@evenhand.example', role: 'editor' },
  { name: 'Tomas Lind', email: 'reader@evenhand.example', role: 'reader' },
];
