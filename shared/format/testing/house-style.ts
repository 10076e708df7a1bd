import { parseHouseStyle, type HouseStyle } from '#shared/house-style';
import openClinical from '../../../templates/house-styles/open-clinical/house-style.json';

/** A house style to change single settings of. */
export const OPEN_CLINICAL: HouseStyle = parsed(openClinical);

/** A style with some settings of one part changed. */
export function styleWith<Part extends keyof HouseStyle>(
  part: Part,
  settings: Partial<HouseStyle[Part]>,
): HouseStyle {
  return { ...OPEN_CLINICAL, [part]: { ...(OPEN_CLINICAL[part] as object), ...settings } };
}

function parsed(json: unknown): HouseStyle {
  const result = parseHouseStyle(json);
  if (!result.ok) {
    throw new Error(JSON.stringify(result.issue));
  }
  return result.value;
}
