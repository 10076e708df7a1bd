import { describe, expect, it } from 'vitest';
import { GUARDS, findGuards } from '#shared/analysis';
import type { AnalysisResult, GuardContext, GuardFinding, GuardId } from '#shared/analysis';
import { resultOf } from '../../shared/analysis/testing/counts-analysis';
import type { CountsAnalysis } from '../../shared/analysis/testing/counts-analysis';

/** Counts about which no guard has anything to say. */
const QUIET: CountsAnalysis = {
  levels: ['no', 'yes'],
  counts: {
    kitchen: [
      [20, 400],
      [32, 400],
    ],
    ward: [
      [22, 400],
      [34, 400],
    ],
  },
};

interface Example {
  readonly result: AnalysisResult;
  readonly context?: GuardContext;
  /** What the guard must find, in the order in which it finds it. */
  readonly found: readonly Partial<GuardFinding>[];
}

const crude = { kind: 'crude' } as const;
const pooled = { kind: 'pooled' } as const;

const EXAMPLES: Readonly<Record<GuardId, Example>> = {
  oneLevelExposure: {
    result: resultOf({
      levels: ['no', 'yes'],
      counts: [
        [3, 10],
        [0, 0],
      ],
    }),
    found: [{ severity: 'refusal', facts: { levels: 1, levelIds: ['no'] } }],
  },
  allOrNoEvents: {
    result: resultOf({
      levels: ['no', 'yes'],
      counts: [
        [0, 10],
        [0, 12],
      ],
    }),
    found: [{ severity: 'refusal', facts: { events: 0, total: 22 } }],
  },
  repeatedIdentifiers: {
    result: resultOf(QUIET),
    context: {
      repeatedIdentifiers: { columnId: 'id', columnLabel: 'Badge', identifiers: 3, records: 8 },
    },
    found: [{ facts: { columnId: 'id', columnLabel: 'Badge', identifiers: 3, records: 8 } }],
  },
  turnedRound: {
    result: resultOf({
      levels: ['no', 'yes'],
      counts: {
        low: [
          [90, 900],
          [5, 100],
        ],
        high: [
          [50, 100],
          [400, 900],
        ],
      },
    }),
    found: [
      {
        place: { scope: pooled, levelId: 'yes' },
        facts: {
          measureId: 'riskDifference',
          crude: expect.closeTo(0.405 - 0.14, 9) as number,
          pooled: expect.closeTo((-0.05 * 90 - (1 / 18) * 90) / 180, 9) as number,
        },
      },
    ],
  },
  strataDisagree: {
    result: resultOf({
      levels: ['no', 'yes'],
      counts: {
        A: [
          [10, 100],
          [60, 100],
        ],
        B: [
          [30, 100],
          [32, 100],
        ],
      },
    }),
    found: [
      {
        place: { scope: pooled, levelId: 'yes' },
        facts: expect.objectContaining({
          measureIds: ['riskDifference', 'riskRatio', 'oddsRatio'],
          limit: 0.05,
        }) as GuardFinding['facts'],
      },
    ],
  },
  emptyGroup: {
    result: resultOf({
      levels: ['a', 'b', 'c'],
      counts: [
        [0, 0],
        [3, 10],
        [5, 10],
      ],
    }),
    found: [{ place: { scope: crude, levelId: 'a' }, facts: { role: 'reference' } }],
  },
  zeroCell: {
    result: resultOf({
      levels: ['no', 'yes'],
      counts: [
        [0, 30],
        [12, 30],
      ],
    }),
    found: [
      {
        place: { scope: crude, levelId: 'yes' },
        facts: {
          measureIds: ['riskRatio', 'oddsRatio'],
          indexEvents: 12,
          indexTotal: 30,
          referenceEvents: 0,
          referenceTotal: 30,
        },
      },
    ],
  },
  sparseCells: {
    result: resultOf({
      levels: ['no', 'yes'],
      counts: [
        [2, 10],
        [2, 30],
      ],
    }),
    found: [
      {
        place: { scope: crude, levelId: null },
        facts: { cells: 2, ofCells: 4, smallestExpected: 1, limit: 5, levelIds: ['no', 'yes'] },
      },
    ],
  },
  commonOutcome: {
    result: resultOf({
      levels: ['no', 'yes'],
      counts: [
        [48, 80],
        [56, 70],
      ],
    }),
    found: [
      {
        place: { scope: crude, levelId: 'yes' },
        facts: {
          referenceRisk: 0.6,
          oddsRatio: expect.closeTo((56 * 32) / (14 * 48), 12) as number,
          riskRatio: expect.closeTo(0.8 / 0.6, 12) as number,
          excess: expect.closeTo(1, 12) as number,
          limit: 0.1,
        },
      },
    ],
  },
  intervalAgainstTest: {
    result: resultOf({
      levels: ['no', 'yes'],
      counts: [
        [6, 40],
        [14, 40],
      ],
    }),
    found: [
      {
        place: { scope: crude, levelId: 'yes' },
        facts: {
          measureIds: ['riskRatio'],
          method: 'pearsonChiSquare',
          pValue: expect.closeTo(0.0388671, 6) as number,
          largest: expect.closeTo(0.05, 12) as number,
        },
      },
    ],
  },
  levelsOutOfOrder: {
    result: resultOf({
      levels: ['0-39', '120+', '40-79', '80-119'],
      counts: [
        [9, 90],
        [20, 90],
        [12, 90],
        [15, 90],
      ],
      exposureKind: 'orderedCategory',
    }),
    found: [{ facts: { levelIds: ['0-39', '40-79', '80-119', '120+'] } }],
  },
  orderedAsUnordered: {
    result: resultOf({
      levels: ['0-39', '40-79', '80-119'],
      counts: [
        [9, 90],
        [12, 90],
        [15, 90],
      ],
    }),
    found: [{ severity: 'note', facts: { ground: 'bounds' } }],
  },
  stratumLeftOut: {
    result: resultOf({
      levels: ['no', 'yes'],
      counts: {
        A: [
          [9, 90],
          [12, 90],
        ],
        B: [
          [9, 90],
          [0, 0],
        ],
      },
    }),
    found: [
      {
        place: { scope: { kind: 'stratum', stratumId: 'B' }, levelId: null },
        facts: { code: 'emptyGroup', group: 'index', levelIds: ['yes'] },
      },
    ],
  },
  noRiskByDesign: {
    result: resultOf({ ...QUIET, design: 'caseControl' }),
    found: [{ severity: 'note', facts: { design: 'caseControl' } }],
  },
};

describe.each(Object.keys(GUARDS) as GuardId[])('guard %s', (guardId) => {
  it('is named and sourced under its own id', () => {
    expect(GUARDS[guardId].id).toBe(guardId);
    expect(GUARDS[guardId].source.length).toBeGreaterThan(10);
  });

  it('finds what it is for, with its facts and place', () => {
    const { result, context, found } = EXAMPLES[guardId];
    const findings = findGuards(result, context).filter((one) => one.guardId === guardId);
    expect(findings).toHaveLength(found.length);
    findings.forEach((finding, place) => {
      expect(finding).toMatchObject(found[place]!);
    });
  });

  it('is silent about quiet counts', () => {
    const findings = findGuards(resultOf(QUIET)).map((finding) => finding.guardId);
    expect(findings).not.toContain(guardId);
  });
});

describe('findings', () => {
  it('are plain data', () => {
    for (const { result, context } of Object.values(EXAMPLES)) {
      const findings = findGuards(result, context);
      expect(JSON.parse(JSON.stringify(findings))).toEqual(findings);
    }
  });

  it('of an order do not blame a falling one, nor labels that state none', () => {
    const falling = resultOf({
      levels: ['80+', '40-79', '0-39'],
      counts: [
        [15, 90],
        [12, 90],
        [9, 90],
      ],
      exposureKind: 'orderedCategory',
    });
    const names = resultOf({
      levels: ['red', 'blue', 'grey'],
      counts: [
        [9, 90],
        [12, 90],
        [9, 90],
      ],
    });
    for (const result of [falling, names]) {
      expect(findGuards(result).map(({ guardId }) => guardId)).toEqual([]);
    }
  });
});
