import { computed, inject, type Signal } from '@angular/core';
import { CurrentStudy } from '../session/current-study';

/** A place that the spine leads to. */
export interface Section {
  readonly name: string;
  readonly initials: string;
  readonly link: readonly string[];
  /** Whether the link is current only at its very address. */
  readonly exact: boolean;
  /** The second stroke after G, if it has one. */
  readonly key: string | null;
}

const DESK: Section = { name: 'Desk', initials: 'De', link: ['/desk'], exact: true, key: 'D' };

/** The desk, then the sections of the open study. */
export function sections(): Signal<readonly Section[]> {
  const study = inject(CurrentStudy).study;
  return computed(() => {
    const open = study();
    return open === null ? [DESK] : [DESK, ...studySections(open.id)];
  });
}

function studySections(studyId: string): readonly Section[] {
  const study = ['/studies', studyId];
  return [
    { name: 'Study', initials: 'St', link: study, exact: true, key: 'S' },
    { name: 'Data', initials: 'Da', link: [...study, 'data'], exact: false, key: 'T' },
    { name: 'Code book', initials: 'Co', link: [...study, 'code-book'], exact: false, key: 'B' },
    { name: 'Analyses', initials: 'An', link: [...study, 'analyses'], exact: false, key: 'A' },
    { name: 'Report', initials: 'Re', link: [...study, 'reports'], exact: false, key: 'R' },
  ];
}
