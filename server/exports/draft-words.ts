import type { HouseStyle } from '#shared/house-style';
import type { ExportRequest } from './export-request';

/** What every file says about itself before anything else. */
export function draftLines({ changedAt, houseStyle, study }: ExportRequest): readonly string[] {
  const day = dayInWords(changedAt, houseStyle.language);
  return [
    `Draft, as of ${day}. Study: ${study.title}.`,
    'Results are no medical advice. Effect estimates need the reading of a statistician and of a ' +
      'clinician. Small counts can identify people: follow the data agreement and local rules.',
    ...(study.invented ? [INVENTED] : []),
  ];
}

/** What stands at the head of every page. */
export function draftLabel({ study }: ExportRequest): string {
  return study.invented ? 'Draft · invented data' : 'Draft';
}

/** A day as the language of the house style writes it, from an ISO date or moment (UTC). */
export function dayInWords(moment: string, language: HouseStyle['language']): string {
  const format = new Intl.DateTimeFormat(language, { dateStyle: 'long', timeZone: 'UTC' });
  return format.format(new Date(moment));
}

const INVENTED = 'All data of this study are invented for demonstration; they describe nobody.';
