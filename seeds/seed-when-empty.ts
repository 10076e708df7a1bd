import { readConfiguration } from '../server/config';
import { openDependencies } from '../server/dependencies';
import { seed } from './seed';

/**
 * Fills the database of this installation with the demonstration studies, unless it holds accounts
 * already or EVENHAND_DEMONSTRATION is "no". Says what it does.
 */
export async function seedWhenEmpty(): Promise<void> {
  const config = readConfiguration(process.env);
  if (config.demonstration === 'never') return;
  const dependencies = await openDependencies(config);
  try {
    if ((await dependencies.database.stores.users.count()) > 0) return;
    console.log('Demonstration: filling the empty database with invented studies …');
    await seed(dependencies, (title) => {
      console.log(`  ${title}`);
    });
  } finally {
    await dependencies.background.idle();
    await dependencies.exporter.close();
    await dependencies.database.close();
  }
}
