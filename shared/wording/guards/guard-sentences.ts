import type { GuardId } from '#shared/analysis';
import { fillWords } from '../phrasebook/fill-pattern';
import { verbWords } from '../sentence/outcome';
import { leftOutSentences } from '../print/left-out-notes';
import { testMethod } from '../print/method-words';
import { strataWords, termsOf } from '../print/print-context';
import { countWords, type GuardFactsReader } from './guard-facts';

type GuardSentence = (reader: GuardFactsReader) => string;

/** The sentence of every guard. */
export const GUARD_SENTENCES: Readonly<Record<GuardId, GuardSentence>> = {
  oneLevelExposure: (reader) =>
    fillWords(reader.context.book, 'guard.oneLevelExposure.sentence', {
      levels: reader.levels('levelIds'),
    }),
  allOrNoEvents,
  repeatedIdentifiers: (reader) =>
    fillWords(reader.context.book, 'guard.repeatedIdentifiers.sentence', {
      column: reader.text('columnLabel'),
      identifiers: reader.count('identifiers'),
      records: reader.count('records'),
    }),
  turnedRound,
  strataDisagree,
  emptyGroup,
  zeroCell,
  sparseCells: (reader) =>
    fillWords(reader.context.book, 'guard.sparseCells.sentence', {
      place: reader.place(),
      cells: reader.count('cells'),
      ofCells: reader.count('ofCells'),
      limit: reader.count('limit'),
      smallest: reader.decimal('smallestExpected'),
    }),
  commonOutcome,
  intervalAgainstTest,
  levelsOutOfOrder: (reader) =>
    fillWords(reader.context.book, 'guard.levelsOutOfOrder.sentence', {
      levels: reader.levels('levelIds'),
    }),
  orderedAsUnordered: (reader) =>
    fillWords(reader.context.book, 'guard.orderedAsUnordered.sentence', {
      exposure: reader.context.result.frame.exposure.label,
    }),
  stratumLeftOut,
  noRiskByDesign: ({ context }) => fillWords(context.book, 'guard.noRiskByDesign.sentence', {}),
};

function allOrNoEvents(reader: GuardFactsReader): string {
  const { book, result } = reader.context;
  return fillWords(book, 'guard.allOrNoEvents.sentence', {
    events: reader.count('events'),
    total: reader.count('total'),
    verb: verbWords(result.frame.outcome, book),
  });
}

function turnedRound(reader: GuardFactsReader): string {
  const { context, finding } = reader;
  const { exposure } = context.result.frame;
  const measure = finding.facts.measureId === 'oddsRatio' ? 'oddsRatio' : 'riskDifference';
  return fillWords(context.book, 'guard.turnedRound.sentence', {
    index: reader.group(finding.place.levelId ?? ''),
    reference: reader.group(exposure.referenceLevelId, 'those'),
    measure: reader.measureName(measure),
    crude: reader.measureValue(measure, 'crude'),
    pooled: reader.measureValue(measure, 'pooled'),
    strata: strataWords(context) ?? '',
  });
}

function strataDisagree(reader: GuardFactsReader): string {
  const { book } = reader.context;
  const tests = reader.measures('measureIds').map((id) =>
    fillWords(book, 'guard.testOf', {
      measure: reader.measureName(id),
      test: reader.pValue(`${id}PValue`),
    }),
  );
  return fillWords(book, 'guard.strataDisagree.sentence', {
    level: reader.levelLabel(reader.finding.place.levelId ?? ''),
    tests: tests.join(fillWords(book, 'list.semicolon', {})),
  });
}

function emptyGroup(reader: GuardFactsReader): string {
  const { book } = reader.context;
  const isReference = reader.text('role') === 'reference';
  return fillWords(book, 'guard.emptyGroup.sentence', {
    group: reader.group(reader.finding.place.levelId ?? ''),
    consequence: fillWords(book, `guard.emptyGroup.as${isReference ? 'Reference' : 'Index'}`, {}),
  });
}

function zeroCell(reader: GuardFactsReader): string {
  const { book, result } = reader.context;
  const measures = reader.measures('measureIds').map((id) => reader.measureName(id));
  return fillWords(book, 'guard.zeroCell.sentence', {
    place: reader.place(),
    index: reader.group(reader.finding.place.levelId ?? ''),
    indexCount: countWords(reader, 'indexEvents', 'indexTotal'),
    reference: reader.group(result.frame.exposure.referenceLevelId, 'those'),
    referenceCount: countWords(reader, 'referenceEvents', 'referenceTotal'),
    measures: measures.join(fillWords(book, 'list.and', {})),
  });
}

function commonOutcome(reader: GuardFactsReader): string {
  const { context } = reader;
  return fillWords(context.book, 'guard.commonOutcome.sentence', {
    level: reader.levelLabel(reader.finding.place.levelId ?? ''),
    noun: termsOf(context).noun,
    risk: reader.percent('referenceRisk'),
    oddsRatio: reader.measureValue('oddsRatio', 'oddsRatio'),
    riskRatio: reader.measureValue('riskRatio', 'riskRatio'),
    ratio: reader.measureName('riskRatio'),
    excess: reader.wholePercent('excess'),
  });
}

function intervalAgainstTest(reader: GuardFactsReader): string {
  const { context, finding } = reader;
  const { pValue, largest } = finding.facts;
  const rejected = Number(pValue) < Number(largest);
  const measures = reader.measures('measureIds').map((id) => reader.measureName(id));
  const key = `guard.intervalAgainstTest.${rejected ? 'rejected' : 'kept'}` as const;
  return fillWords(context.book, key, {
    place: reader.place(),
    level: reader.levelLabel(finding.place.levelId ?? ''),
    test: reader.pValue('pValue'),
    method: testMethod(reader.text('method')),
    measures: measures.join(fillWords(context.book, 'list.andThe', {})),
  });
}

function stratumLeftOut({ context, finding }: GuardFactsReader): string {
  const { scope } = finding.place;
  return scope.kind === 'stratum' ? leftOutSentences(context, scope.stratumId).join(' ') : '';
}
