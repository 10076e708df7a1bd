import { join } from 'node:path';
import { parsePhrasebook, type Phrasebook } from '#shared/wording';
import { readTemplate } from './read-template';

/** Reads the English phrasebook, `phrasebooks/en.json`. Throws when it is missing or broken. */
export function readPhrasebook(templatesDirectory: string): Phrasebook {
  return readTemplate(join(templatesDirectory, 'phrasebooks', 'en.json'), parsePhrasebook);
}
