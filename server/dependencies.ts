import type { HouseStyle } from '#shared/house-style';
import type { Phrasebook } from '#shared/wording';
import type { Configuration } from './config';
import type { ErrorLog } from './errors/error-handler';
import type { CountingEngine } from './counting/counting-engine';
import { createCountingEngine } from './counting/sqlite-counting-engine';
import { createExporter, type Exporter } from './exports/exporter';
import { createIntake, type Intake } from './intake/intake';
import { openDatabase, type Database } from './models/database';
import { createBackground, type Background } from './runtime/background';
import { systemClock, type Clock } from './runtime/clock';
import { timeOrderedIds, type Ids } from './runtime/ids';
import { systemRandomness, type Randomness } from './runtime/randomness';
import { createBackOff, type BackOff } from './session/back-off';
import { createPasswords, type Passwords } from './session/passwords';
import { readSecrets, type Secrets } from './session/secrets';
import { readHouseStyles } from './templates/house-styles';
import { readPhrasebook } from './templates/phrasebooks';
import { readLetters, type WriteLetter } from './mail/letters';
import { createMailer, type Mailer } from './mail/mailer';

/** What tests replace: time, ids, randomness, the log. */
export interface Runtime {
  readonly clock: Clock;
  readonly ids: Ids;
  readonly randomness: Randomness;
  readonly log: ErrorLog;
}

/** Everything that services reach, passed in; nothing is global. */
export interface Dependencies extends Runtime {
  readonly config: Configuration;
  readonly database: Database;
  readonly secrets: Secrets;
  readonly passwords: Passwords;
  readonly backOff: BackOff;
  readonly mailer: Mailer;
  readonly writeLetter: WriteLetter;
  readonly background: Background;
  readonly exporter: Exporter;
  readonly intake: Intake;
  readonly counting: CountingEngine;
  readonly houseStyles: readonly HouseStyle[];
  readonly phrasebook: Phrasebook;
  /** Lets the first administrator be made; printed at start when there are no accounts. */
  readonly firstAdministratorCode: string;
}

/** The machine's own clock, ids and randomness; bugs go to standard error. */
export const SYSTEM_RUNTIME: Runtime = {
  clock: systemClock,
  ids: timeOrderedIds,
  randomness: systemRandomness,
  log: (message, problem) => {
    console.error(message, problem);
  },
};

/** Columns of data cuts that counting keeps in memory. */
const RESIDENT_BYTES = 256 * 1024 * 1024;

/** Opens the data directory and everything that stands on it. */
export async function openDependencies(
  config: Configuration,
  runtime: Runtime = SYSTEM_RUNTIME,
): Promise<Dependencies> {
  const secrets = readSecrets(config.dataDirectory, runtime.randomness);
  const database = await openDatabase(config.dataDirectory);
  return {
    ...runtime,
    config,
    database,
    secrets,
    passwords: await createPasswords(config.passwordCost),
    backOff: createBackOff(runtime.clock),
    mailer: createMailer(config),
    writeLetter: readLetters(config.templatesDirectory),
    background: createBackground(runtime.log),
    exporter: createExporter(runtime.log),
    intake: createIntake(runtime.log),
    counting: createCountingEngine({
      database,
      clock: runtime.clock,
      residentBytes: RESIDENT_BYTES,
    }),
    houseStyles: readHouseStyles(config.templatesDirectory),
    phrasebook: readPhrasebook(config.templatesDirectory),
    firstAdministratorCode: firstAdministratorCode(runtime.randomness),
  };
}

/** Four groups of four letters and digits that are told apart easily. */
function firstAdministratorCode(randomness: Randomness): string {
  const alphabet = 'ABCDEFGHJKLMNPQRSTUVWXYZ23456789';
  const characters = [...randomness(16)].map((byte) => alphabet.charAt(byte % alphabet.length));
  return [0, 4, 8, 12].map((start) => characters.slice(start, start + 4).join('')).join('-');
}
