import type { ShelvedStudy } from './desk-store';

/** A study or report whose title has the words that were typed. */
export interface Found {
  readonly id: string;
  readonly kind: 'Study' | 'Report';
  readonly title: string;
  readonly link: readonly string[];
}

const MOST = 8;

/** Studies and reports whose title has every word of the text, in any order; a few of them. */
export function found(text: string, shelf: readonly ShelvedStudy[]): readonly Found[] {
  const words = text.toLowerCase().split(/\s+/).filter(Boolean);
  if (words.length === 0) return [];
  return shelf
    .flatMap(titled)
    .filter(({ title }) => words.every((word) => title.toLowerCase().includes(word)))
    .slice(0, MOST);
}

function titled({ study, reports }: ShelvedStudy): readonly Found[] {
  const link = ['/studies', study.id];
  return [
    { id: study.id, kind: 'Study', title: study.title, link },
    ...reports.map((report): Found => ({
      id: report.id,
      kind: 'Report',
      title: report.title,
      link: [...link, 'reports', report.id],
    })),
  ];
}
