import { EFFECT_MEASURE_IDS, type EffectMeasureId } from '#shared/effects';
import type { PooledContrastResult, StratumLeftOut } from '#shared/analysis';
import { capitalised, fillPattern } from '../phrasebook/fill-pattern';
import { issueWords } from '../issue-words';
import type { Phrase, PhrasePart } from '../phrase';
import { groupAt } from './group-at';
import { termsOf, textPart, type PrintContext } from './print-context';

/** Which strata the pooled estimates left out, and why, one note a stratum and reason. */
export function leftOutNotes(
  context: PrintContext,
  measures: readonly EffectMeasureId[],
): readonly Phrase[] {
  const everywhere = context.result.pooled.flatMap((contrast) =>
    contrast.leftOut.map((stratum) => everywhereNote(context, contrast, stratum)),
  );
  const some = context.result.pooled.flatMap((contrast) =>
    EFFECT_MEASURE_IDS.filter((id) => measures.includes(id)).flatMap((id) =>
      leftOutOfMeasure(contrast, id).map((stratum) => measureNote(context, id, stratum)),
    ),
  );
  return [...new Set([...everywhere, ...some])].map((text) => ({ parts: [textPart(text)] }));
}

/** Why no pooled number could use a stratum, every reason once. */
export function leftOutSentences(context: PrintContext, stratumId: string): readonly string[] {
  const reasons = context.result.pooled.flatMap((contrast) =>
    contrast.leftOut
      .filter((stratum) => stratum.stratumId === stratumId)
      .map((stratum) => everywhereNote(context, contrast, stratum)),
  );
  return [...new Set(reasons)];
}

function leftOutOfMeasure(
  { measureLeftOut, leftOut }: PooledContrastResult,
  id: EffectMeasureId,
): readonly StratumLeftOut[] {
  const everywhere = new Set(leftOut.map(({ stratumId }) => stratumId));
  return (measureLeftOut?.[id] ?? []).filter(({ stratumId }) => !everywhere.has(stratumId));
}

function everywhereNote(
  context: PrintContext,
  contrast: PooledContrastResult,
  { stratumId, issue }: StratumLeftOut,
): string {
  const { book } = context;
  const stratum = stratumLabel(context, stratumId);
  if (issue.code !== 'emptyGroup') {
    const reason = issueWords(issue, book);
    return sentence(fillPattern(book, 'note.leftOutOther', { stratum, reason }));
  }
  const levelId = emptyLevel(context, contrast, stratumId);
  const group = levelId === null ? null : groupAt(context, levelId);
  return sentence(
    group === null
      ? fillPattern(book, 'note.leftOutEmpty', { stratum })
      : fillPattern(book, 'note.leftOutGroup', { stratum, group }),
  );
}

/** The one level of the contrast without records in the stratum; null where both have none. */
function emptyLevel(
  { result }: PrintContext,
  { indexLevelId, referenceLevelId }: PooledContrastResult,
  stratumId: string,
): string | null {
  const layer = result.strata.find((candidate) => candidate.stratumId === stratumId);
  const empty = [indexLevelId, referenceLevelId].filter(
    (id) => layer?.levels.find(({ levelId }) => levelId === id)?.count.total === 0,
  );
  return empty.length === 1 ? (empty[0] ?? null) : null;
}

function measureNote(
  context: PrintContext,
  id: EffectMeasureId,
  { stratumId, issue }: StratumLeftOut,
): string {
  const { book } = context;
  return sentence(
    fillPattern(book, 'note.leftOutOfMeasure', {
      stratum: stratumLabel(context, stratumId),
      reason: issueWords(issue, book),
      measure: termsOf(context).measures[id].name,
    }),
  );
}

function stratumLabel({ result }: PrintContext, stratumId: string): string {
  return result.frame.strata.find(({ id }) => id === stratumId)?.label ?? stratumId;
}

function sentence(parts: readonly PhrasePart[]): string {
  return capitalised(parts.map(({ text }) => text).join(''));
}
