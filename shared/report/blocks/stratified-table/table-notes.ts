import type { Run, TableElement } from '#shared/layout';
import { fillPattern, outsideNote, pValueNotes, tableNotes } from '#shared/wording';
import type { Phrase, TableContents } from '#shared/wording';
import { abbreviationNote } from '../abbreviation-note';
import { phraseRuns } from '../phrase-runs';
import { wordsRun } from '../table-cells';
import type { TableChoice } from './content';
import { lacksLevels, missingMark } from './outside-columns';
import type { TablePlan } from './table-plan';
import type { TableSetting } from './table-setting';

/** The notes of a table as its plan shows it, with its abbreviations where the style wants them. */
export function notesOfTable(
  show: TableChoice,
  { plan, head }: { readonly plan: TablePlan; readonly head: TableElement['head'] },
  setting: TableSetting,
): readonly (readonly Run[])[] {
  const { houseStyle, phrasebook, blockId } = setting;
  const notes = [
    ...tableNotes(setting, contentsOf(show, plan), houseStyle, phrasebook),
    ...pValuesNote(setting),
    ...countsNote(plan, setting),
    ...outsideNotes(setting),
  ].map((phrase) => phraseRuns(phrase, blockId));
  const heads = head.flat().map(({ runs }) => runs);
  const texts = [...heads, ...notes].flat().map(({ text }) => text);
  const abbreviations = abbreviationNote(texts, setting);
  const first = houseStyle.table.abbreviations === 'first';
  const all = first ? [...abbreviations, ...notes] : [...notes, ...abbreviations];
  return withLead(all, houseStyle.table.notesLead, blockId);
}

/** What the table shows in the end: the choice, as the framing and the design narrowed it. */
function contentsOf(show: TableChoice, plan: TablePlan): TableContents {
  const columns = new Set(plan.layers.flatMap((layer) => layer.columns));
  const scopes = plan.layers.map(({ scope }) => scope.kind);
  return {
    risk: columns.has('share') || columns.has('casesShare'),
    riskDifference: columns.has('riskDifference'),
    riskRatio: columns.has('riskRatio'),
    oddsRatio: columns.has('oddsRatio'),
    crude: scopes.includes('crude'),
    pooled: scopes.includes('pooled'),
    trend: show.trend,
  };
}

/** The tests behind the p-values, and the number of contrasts that they are adjusted for. */
function pValuesNote({ pValues, houseStyle, phrasebook }: TableSetting): readonly Phrase[] {
  if (pValues === null) return [];
  const { placed, adjustment } = pValues;
  const methods = [...new Set([...placed.values()].map(({ method }) => method))];
  return pValueNotes({ methods, contrasts: placed.size, adjustment }, houseStyle, phrasebook);
}

/** What stands behind each column of estimates from elsewhere, and who computed it. */
function outsideNotes(setting: TableSetting): readonly Phrase[] {
  const { outsideNoted, houseStyle, phrasebook } = setting;
  const mark = missingMark(houseStyle);
  const missing = { parts: fillPattern(phrasebook, 'outside.missing', { mark }) };
  return [
    ...outsideNoted.map((column) => outsideNote(column, setting, houseStyle, phrasebook)),
    ...(lacksLevels(setting) ? [missing] : []),
  ];
}

/** Counts are never adjusted; beside adjusted estimates that has to be said. */
function countsNote(plan: TablePlan, { phrasebook }: TableSetting): readonly Phrase[] {
  const beside = plan.layers.some(
    ({ scope, columns }) => scope.kind === 'pooled' && columns.includes('count'),
  );
  return beside ? [{ parts: fillPattern(phrasebook, 'note.pooledCounts', {}) }] : [];
}

function withLead(
  notes: readonly (readonly Run[])[],
  lead: string,
  blockId: string,
): readonly (readonly Run[])[] {
  const [first, ...others] = notes;
  if (first === undefined || lead === '') return notes;
  return [[wordsRun(lead, blockId, ['italic']), ...first], ...others];
}
