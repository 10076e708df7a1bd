import type { Dependencies } from '../dependencies';
import { readDemonstration } from '../services/demonstration/demonstration';

/** What to say when the server is up: where to go, and how to get in. */
export async function welcome(dependencies: Dependencies): Promise<readonly string[]> {
  const { config } = dependencies;
  return [
    '',
    `Evenhand is ready. Open ${config.publicUrl}`,
    ...(await howToGetIn(dependencies)),
    '',
  ];
}

async function howToGetIn(dependencies: Dependencies): Promise<readonly string[]> {
  const demonstration = await readDemonstration(dependencies);
  if (demonstration !== null) {
    const accounts = demonstration.accounts.map(({ email, role }) => `  ${email} (${role})`);
    return [
      `Demonstration accounts, all with the password "${demonstration.password}":`,
      ...accounts,
    ];
  }
  if ((await dependencies.database.stores.users.count()) > 0) return [];
  return [
    'There are no accounts yet. The page asks for the first administrator and for this code:',
    `  ${dependencies.firstAdministratorCode}`,
  ];
}
