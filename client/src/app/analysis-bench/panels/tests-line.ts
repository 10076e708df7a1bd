import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import {
  type ContrastResult,
  contrastTestId,
  layerAt,
  type LayerResult,
  pooledAt,
  trendTestId,
} from '#shared/analysis';
import type { Result } from '#shared/core';
import {
  type EstimationIssue,
  type MethodWords,
  TEST_METHODS,
  type TestOutcome,
} from '#shared/stats';
import { BenchStore } from '../bench/bench-store';
import { contrastLabel } from '../bench/result-scopes';
import { type BenchPrint, printedPValue } from '../print/bench-print';

interface PrintedTest {
  readonly name: string;
  readonly about: string;
  readonly text: string;
}

/** The tests of the layer in view: of the chosen contrast, and over all levels. */
@Component({
  selector: 'eh-tests-line',
  template: `
    <table class="three-rule">
      <caption class="sr">
        Tests
      </caption>
      <thead>
        <tr>
          <th scope="col" class="words">Test</th>
          <th scope="col" class="words">Of</th>
          <th scope="col">p</th>
        </tr>
      </thead>
      <tbody>
        @for (test of tests(); track $index) {
          <tr>
            <th scope="row">{{ test.name }}</th>
            <td class="words">{{ test.about }}</td>
            <td>{{ test.text }}</td>
          </tr>
        }
      </tbody>
    </table>
  `,
  styles: `
    :host {
      display: block;
      padding-top: 12px;
    }
    .words {
      color: var(--ink-2);
    }
    td:last-child {
      max-width: 260px;
    }
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class TestsLine {
  private readonly store = inject(BenchStore);

  protected readonly tests = computed<readonly PrintedTest[]>(() => {
    const print = this.store.print();
    return print === null ? [] : testsOf(print, this.store);
  });
}

const METHODS: Readonly<Record<string, MethodWords>> = TEST_METHODS;

function testsOf(print: BenchPrint, store: BenchStore): readonly PrintedTest[] {
  const { result } = print;
  const levelId = store.levelId();
  const pair = contrastLabel(result, levelId);
  const scope = store.scope();
  const pooled = scope.kind === 'pooled' ? pooledAt(result, levelId) : undefined;
  if (pooled !== undefined) {
    return [printed(print, 'cochranMantelHaenszel', pair, pooled.conditionalIndependence)];
  }
  const layer = layerAt(result, scope);
  const contrast = layer?.contrasts.find(({ indexLevelId }) => indexLevelId === levelId);
  if (layer === undefined || contrast === undefined) return [];
  const severalLevels = result.frame.exposure.levels.length > 2;
  return [
    ...chosenTest(print, pair, contrast),
    printed(print, 'pearsonChiSquare', pair, contrast.pearson),
    printed(print, 'fisherExact', pair, contrast.fisher),
    ...(severalLevels ? [printed(print, 'pearsonChiSquare', 'all levels', layer.association)] : []),
    ...(severalLevels ? [trendOf(print, layer)] : []),
  ];
}

/** The test that the analysis chose, unless it is shown anyway. */
function chosenTest(
  print: BenchPrint,
  pair: string,
  { test }: ContrastResult,
): readonly PrintedTest[] {
  const id = contrastTestId(print.result.specification);
  const shown = id === null || id === 'pearsonChiSquare' || id === 'fisherExact';
  return shown || test === undefined ? [] : [printed(print, id, pair, test)];
}

function trendOf(print: BenchPrint, layer: LayerResult): PrintedTest {
  return printed(
    print,
    trendTestId(print.result.specification),
    `all levels, scores ${scoresOf(print)}`,
    layer.trend,
  );
}

function printed(
  print: BenchPrint,
  methodId: string,
  about: string,
  test: Result<TestOutcome, EstimationIssue>,
): PrintedTest {
  const pValue = printedPValue(print, test);
  return {
    name: METHODS[methodId]?.label ?? methodId,
    about,
    text: pValue.ok ? pValue.value : pValue.reason,
  };
}

function scoresOf({ result }: BenchPrint): string {
  const { trendScores } = result.specification;
  const scores = result.frame.exposure.levels.map(({ id }, at) => trendScores?.[id] ?? at + 1);
  return scores.join(', ');
}
