import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { parseHouseStyle, type HouseStyle } from '#shared/house-style';
import { readTemplate } from './read-template';

/**
 * Reads every house style: `house-styles/<id>/house-style.json` of the templates, by name.
 *
 * Throws with the file's name when one is broken, or has another id than its folder.
 */
export function readHouseStyles(templatesDirectory: string): readonly HouseStyle[] {
  const folder = join(templatesDirectory, 'house-styles');
  const ids = readdirSync(folder, { withFileTypes: true })
    .filter((entry) => entry.isDirectory())
    .map((entry) => entry.name);
  const styles = ids.map((id) => readHouseStyle(join(folder, id, 'house-style.json'), id));
  return styles.sort((one, other) => one.name.localeCompare(other.name, 'en'));
}

function readHouseStyle(path: string, id: string): HouseStyle {
  const style = readTemplate(path, parseHouseStyle);
  if (style.id === id) return style;
  throw new Error(`${path} cannot be used: its id is "${style.id}", its folder "${id}".`);
}
