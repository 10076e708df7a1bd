import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { FACTOR_SOURCE } from '#shared/code-book';
import type { CodeBook, CodeBookColumn, FactorLevel } from '#shared/code-book';
import type { StudyDesign } from '#shared/effects';
import type { AnalysisIssue, AnalysisIssueCode } from './analysis-issue';
import type { OutcomeWords, ResultFrame } from './analysis-result';
import { combinations, keptLevels } from './factor-levels';
import type { AnalysisSpecification } from './specification';

/** What a frame takes from the study. */
export interface FrameStudy {
  readonly design: StudyDesign;
  readonly peopleNoun: string;
  readonly population: string;
}

/**
 * The words and the order of levels that a result is computed under, taken from the code book.
 *
 * Exposure levels and strata come in code-book order, without those that a restriction of their own
 * column takes away; a numeric column counts through its bands. Strata are all combinations of the
 * stratifying columns' levels. Gives an issue for a column or level that is not there, for a column
 * with two roles, and for an outcome without events or without others.
 */
export function frameOf(
  codeBook: CodeBook,
  specification: AnalysisSpecification,
  outcome: OutcomeWords,
  study: FrameStudy,
): Result<ResultFrame, AnalysisIssue> {
  const factors = factorsOf(codeBook, specification);
  if (!factors.ok) {
    return factors;
  }
  const { exposure, strata } = factors.value;
  const issue =
    issueOfOutcome(factors.value.outcome, specification) ??
    issueOfExposure(exposure, specification);
  return issue
    ? failure(issue)
    : success({
        design: study.design,
        peopleNoun: study.peopleNoun,
        population: study.population,
        outcome,
        exposure: exposureFrame(exposure, specification.exposure.referenceLevelId),
        strata: combinations(strata.map(stratumLevels)),
        strataLabel: strata.length > 0 ? strata.map(({ column }) => column.label).join(', ') : null,
      });
}

interface Factor {
  readonly column: CodeBookColumn;
  readonly levels: readonly FactorLevel[];
}

interface Factors {
  readonly outcome: Factor;
  readonly exposure: Factor;
  readonly strata: readonly Factor[];
}

function factorsOf(
  codeBook: CodeBook,
  specification: AnalysisSpecification,
): Result<Factors, AnalysisIssue> {
  const { outcome, exposure, stratumColumnIds } = specification;
  const ids = [outcome.columnId, exposure.columnId, ...stratumColumnIds];
  const twice = ids.find((id, place) => ids.indexOf(id) !== place);
  if (twice !== undefined) {
    return failure({ code: 'columnUsedTwice', facts: { columnId: twice } });
  }
  const factors: Factor[] = [];
  for (const [place, id] of ids.entries()) {
    const factor = factorOf(codeBook, specification, id, ROLES[place] ?? 'stratum');
    if (!factor.ok) {
      return factor;
    }
    factors.push(factor.value);
  }
  const [outcomeFactor, exposureFactor, ...strata] = factors as [Factor, Factor, ...Factor[]];
  return success({ outcome: outcomeFactor, exposure: exposureFactor, strata });
}

const ROLES: readonly string[] = ['outcome', 'exposure'];

function factorOf(
  codeBook: CodeBook,
  specification: AnalysisSpecification,
  columnId: string,
  role: string,
): Result<Factor, AnalysisIssue> {
  const column = codeBook.columns.find(({ id }) => id === columnId);
  if (!column) {
    return failure({ code: 'columnMissing', facts: { columnId, role } });
  }
  const levels = keptLevels(column, specification.restrictions);
  return levels.length === 0
    ? failure({ code: 'columnWithoutLevels', facts: { columnId, role } })
    : success({ column, levels });
}

function issueOfOutcome(
  { column, levels }: Factor,
  { outcome }: AnalysisSpecification,
): AnalysisIssue | null {
  const missing = outcome.eventLevelIds.find((id) => !levels.some((level) => level.id === id));
  if (missing !== undefined) {
    return levelMissing(column.id, missing, 'outcome');
  }
  const events = new Set(outcome.eventLevelIds).size;
  const code: AnalysisIssueCode | null =
    events === 0 ? 'noEventLevel' : events === levels.length ? 'everyLevelIsEvent' : null;
  return code && { code, facts: { columnId: column.id } };
}

function issueOfExposure(
  { column, levels }: Factor,
  { exposure }: AnalysisSpecification,
): AnalysisIssue | null {
  if (!levels.some((level) => level.id === exposure.referenceLevelId)) {
    return levelMissing(column.id, exposure.referenceLevelId, 'reference');
  }
  const facts = { columnId: column.id, levels: levels.length };
  return levels.length < 2 ? { code: 'fewerThanTwoExposureLevels', facts } : null;
}

function levelMissing(columnId: string, levelId: string, role: string): AnalysisIssue {
  return { code: 'levelMissing', facts: { columnId, levelId, role } };
}

function exposureFrame(
  { column, levels }: Factor,
  referenceLevelId: string,
): ResultFrame['exposure'] {
  return {
    columnId: column.id,
    label: column.label,
    sentenceLabel: column.sentenceLabel,
    unit: column.unit,
    ordered: column.kind === 'orderedCategory' || FACTOR_SOURCE[column.kind] === 'bands',
    levels,
    referenceLevelId,
    groupPattern: column.groupPattern ?? null,
  };
}

function stratumLevels({ column, levels }: Factor): readonly FactorLevel[] {
  const { sentenceLabel: columnLabel, withinPattern } = column;
  return levels.map((level) => ({
    ...level,
    within: [{ columnLabel, levelLabel: level.sentenceLabel, pattern: withinPattern ?? null }],
  }));
}
