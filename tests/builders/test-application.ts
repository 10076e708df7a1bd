import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Express } from 'express';
import type { StudyRole } from '#shared/permissions';
import { createApp } from '../../server/app';
import { readConfiguration, type Configuration } from '../../server/config';
import { openDependencies, SYSTEM_RUNTIME, type Dependencies } from '../../server/dependencies';
import type { Study } from '../../server/models/study/study-store';
import type { User } from '../../server/models/user/user-store';
import { runStartUpTasks } from '../../server/start-up/start-up-tasks';
import { openBrowser, type Browser } from './browser';
import { movableClock, type MovableClock } from './movable-clock';

/** The password of every person that a test application adds. */
export const TEST_PASSWORD = 'a long enough password';

/** An application of its own for a test file: temporary data, cheap hashes, a movable clock. */
export interface TestApplication {
  readonly app: Express;
  readonly dependencies: Dependencies;
  readonly clock: MovableClock;
  /** Bugs that the application wrote to its log; a test that ends with one should fail. */
  readonly bugs: readonly unknown[];
  /** A browser in which nobody is signed in. */
  readonly browser: () => Promise<Browser>;
  /** A browser in which this person is signed in. */
  readonly signedIn: (person: User) => Promise<Browser>;
  readonly addPerson: (details?: Partial<User>) => Promise<User>;
  readonly addStudy: (details?: Partial<Study>) => Promise<Study>;
  readonly addMember: (study: Study, person: User, role: StudyRole) => Promise<void>;
  /** Adds a person with this role on the study, and opens a browser for them. */
  readonly memberBrowser: (study: Study, role: StudyRole) => Promise<Browser>;
  /** Ends the application and removes its data. */
  readonly close: () => Promise<void>;
}

/** Starts an application on a new temporary data directory. */
export async function startTestApplication(
  changes: Partial<Configuration> = {},
): Promise<TestApplication> {
  const dataDirectory = await mkdtemp(join(tmpdir(), 'evenhand-test-'));
  const clock = movableClock();
  const bugs: unknown[] = [];
  const config = { ...testConfiguration(dataDirectory), ...changes };
  const log = (message: string, problem: unknown): void => void bugs.push(message, problem);
  const dependencies = await openDependencies(config, { ...SYSTEM_RUNTIME, clock, log });
  await runStartUpTasks(dependencies);
  const application = createApp(dependencies);
  const add = additions(dependencies);
  const signedIn = (person: User) => signInBrowser(application.app, person);
  return {
    app: application.app,
    dependencies,
    clock,
    bugs,
    ...add,
    browser: () => openBrowser(application.app),
    signedIn,
    memberBrowser: async (study, role) => {
      const person = await add.addPerson({ name: `Robin ${role}` });
      await add.addMember(study, person, role);
      return signedIn(person);
    },
    close: async () => {
      application.stop();
      await dependencies.intake.close();
      await dependencies.background.idle();
      await dependencies.exporter.close();
      await dependencies.database.close();
      await rm(dataDirectory, { recursive: true, force: true });
    },
  };
}

function testConfiguration(dataDirectory: string): Configuration {
  return {
    ...readConfiguration({ EVENHAND_DATA: dataDirectory }),
    passwordCost: { memoryInKibibytes: 8, passes: 1 },
    failedSignInsPerAddress: 1000,
    demonstration: 'never',
    answers: 'checked',
  };
}

async function signInBrowser(app: Express, person: User): Promise<Browser> {
  const browser = await openBrowser(app);
  const response = await browser.signIn(person.email, TEST_PASSWORD);
  if (response.status !== 200) throw new Error(`Sign-in gave ${String(response.status)}.`);
  return browser;
}

type Additions = Pick<TestApplication, 'addPerson' | 'addStudy' | 'addMember'>;

function additions({ database, clock, ids, passwords }: Dependencies): Additions {
  const now = (): string => clock.now().toISOString();
  return {
    addPerson: async (details = {}) => {
      const id = ids.next();
      const passwordHash = await passwords.hash(TEST_PASSWORD);
      const given = { id, email: `${id}@example.org`, name: 'Robin Moss', passwordHash };
      const state = { administrator: false, disabled: false, createdAt: now(), lastSignInAt: null };
      const person = { ...given, ...state, ...details };
      await database.unitOfWork('site', (unit) => database.stores.users.insert(person, unit));
      return { ...person, emailKey: person.email.toLowerCase() };
    },
    addStudy: async (details = {}) => {
      const words = { title: 'Wet work', design: 'cohort', peopleNoun: 'workers' } as const;
      const rest = { population: '', invented: false, createdAt: now(), updatedAt: now() };
      const study: Study = { id: ids.next(), ...words, ...rest, ...details };
      await database.unitOfWork('site', (unit) => database.stores.studies.insert(study, unit));
      return study;
    },
    addMember: async (study, person, role) => {
      const membership = { studyId: study.id, userId: person.id, role, createdAt: now() };
      await database.unitOfWork('site', (unit) =>
        database.stores.memberships.insert(membership, unit),
      );
    },
  };
}
