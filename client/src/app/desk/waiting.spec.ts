import type { ReportSummary, StudyView } from '#shared/api';
import type { StudyRole } from '#shared/permissions';
import { expect, it } from 'vitest';
import { waitingOn } from './waiting';

function study(role: StudyRole, more: Partial<StudyView> = {}): StudyView {
  return {
    id: 's1',
    title: 'Wet work',
    design: 'cohort',
    role,
    invented: false,
    latestCutNumber: 1,
    reportCount: 1,
    updatedAt: '2025-12-01T09:00:00Z',
    population: '',
    peopleNoun: 'workers',
    outcomes: [
      {
        id: 'o1',
        noun: 'hand eczema',
        verbPhrase: 'developed hand eczema',
        timeFrame: null,
        desirability: 'harmful',
      },
    ],
    milestones: [],
    members: [],
    ...more,
  };
}

function report(blockCount: number): ReportSummary {
  return {
    id: 'r1',
    studyId: 's1',
    title: 'Twelve months',
    stage: 'drafting',
    seq: blockCount,
    blockCount,
    blockKinds: [],
    updatedAt: '2025-12-01T09:00:00Z',
    updatedBy: null,
  };
}

function verbs(...parameters: Parameters<typeof waitingOn>): string[] {
  return waitingOn(...parameters).map(({ verb }) => verb);
}

it('waits for nothing where work is under way', () => {
  expect(waitingOn(study('lead'), [report(4)])).toEqual([]);
});

it('asks a lead of a bare study for its outcome and its data', () => {
  const bare = study('lead', { outcomes: [], latestCutNumber: null });
  expect(verbs(bare, [])).toEqual(['Name it', 'Load data']);
});

it('asks nobody for what their role does not allow', () => {
  const bare = study('reader', { outcomes: [], latestCutNumber: null });
  expect(waitingOn(bare, [])).toEqual([]);
  expect(verbs(study('writer', { latestCutNumber: null }), [report(1)])).toEqual([]);
});

it('asks for a report once there are data, and for its first block', () => {
  expect(verbs(study('writer'), [])).toEqual(['Begin one']);
  const [matter] = waitingOn(study('writer'), [report(0)]);
  expect(matter?.link).toEqual(['/studies', 's1', 'reports', 'r1']);
});
