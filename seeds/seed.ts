import type { Dependencies } from '../server/dependencies';
import { seedAccounts } from './seed-accounts';
import { seedStudy } from './seed-study';
import { HARBOUR_SUPPER } from './studies/harbour-supper';
import { REMINDER_LETTERS } from './studies/reminder-letters';
import { SCREEN_USE } from './studies/screen-use';
import { WET_WORK } from './studies/wet-work';

/** The demonstration studies. Everything in them is invented. */
export const DEMONSTRATION_STUDIES = [WET_WORK, HARBOUR_SUPPER, REMINDER_LETTERS, SCREEN_USE];

/** Fills an empty database with the demonstration studies; tells the title of each. */
export async function seed(
  dependencies: Dependencies,
  tell: (title: string) => void,
): Promise<void> {
  const accounts = await seedAccounts(dependencies);
  for (const study of DEMONSTRATION_STUDIES) {
    tell(study.study.title);
    await seedStudy(dependencies, accounts, study);
  }
}
