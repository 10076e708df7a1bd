/** A mark on an edge of the drawn rule. */
export interface ScaleMark {
  readonly x: number;
  readonly label: string | null;
}

/** An invented effect: shares of people in 100 without and with the exposure. */
export const SHOWN_EFFECT = { reference: 4.66, exposed: 20.86, end: 26, width: 760 } as const;

const PIXELS_PER_PERSON = SHOWN_EFFECT.width / SHOWN_EFFECT.end;

/** Where a number of people in 100 lies on the rule, from its left end. */
export function placeOf(people: number): number {
  return Math.round(people * PIXELS_PER_PERSON * 10) / 10;
}

/** The upper edge: each person in 100, with every fifth named. */
export function peopleMarks(): readonly ScaleMark[] {
  return Array.from({ length: SHOWN_EFFECT.end + 1 }, (_, people) => ({
    x: placeOf(people),
    label: people % 5 === 0 ? peopleLabel(people) : null,
  }));
}

/** The lower edge: each half multiple of the reference, with every whole one named. */
export function multipleMarks(): readonly ScaleMark[] {
  const halves = Math.floor((SHOWN_EFFECT.end / SHOWN_EFFECT.reference) * 2);
  return Array.from({ length: halves + 1 }, (_, half) => ({
    x: placeOf((half / 2) * SHOWN_EFFECT.reference),
    label: half % 2 === 0 ? multipleLabel(half / 2) : null,
  }));
}

function peopleLabel(people: number): string {
  return people === 0 ? '0 in 100' : String(people);
}

function multipleLabel(multiple: number): string {
  return multiple === 0 ? '0' : `${multiple}×`;
}
