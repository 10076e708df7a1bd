import { readFileSync } from 'node:fs';
import { parseHouseStyle, type HouseStyle } from '#shared/house-style';
import { parsePhrasebook, type Phrasebook } from '#shared/wording';

/** Ids of the house styles that come with the application. */
export const HOUSE_STYLE_IDS = [
  'compact-clinical',
  'open-clinical',
  'bracketed-social-health',
  'public-bulletin',
] as const;

/** A house style of the application. */
export function houseStyle(id: (typeof HOUSE_STYLE_IDS)[number] = 'open-clinical'): HouseStyle {
  const parsed = parseHouseStyle(readTemplate(`house-styles/${id}/house-style.json`));
  if (!parsed.ok) {
    throw new Error(JSON.stringify(parsed.issue));
  }
  return parsed.value;
}

/** The English phrasebook of the application. */
export function phrasebook(): Phrasebook {
  const parsed = parsePhrasebook(readTemplate('phrasebooks/en.json'));
  if (!parsed.ok) {
    throw new Error(JSON.stringify(parsed.issue));
  }
  return parsed.value;
}

function readTemplate(path: string): unknown {
  return JSON.parse(readFileSync(new URL(`../../templates/${path}`, import.meta.url), 'utf8'));
}
