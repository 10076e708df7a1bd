import type { AnalysisResult, ResultScope } from '#shared/analysis';
import { designGivesRisk } from '#shared/effects';
import type { EffectMeasureId } from '#shared/effects';
import type { Framing } from '#shared/wording';
import type { StratifiedTableContent, TableChoice } from './content';

/** A column that a table may have in each of its layers. */
export type TableColumnId =
  | 'count'
  | 'share'
  | 'cases'
  | 'casesShare'
  | 'controls'
  | 'controlsShare'
  | EffectMeasureId
  | 'pValue';

/** A layer of the table: a stratum, all records, or the pooled estimates. */
export interface TableLayer {
  readonly scope: ResultScope;
  readonly columns: readonly TableColumnId[];
}

/** What a table shows and how: which layers, with which columns, beside or below each other. */
export interface TablePlan {
  readonly arrangement: 'plain' | 'sideBySide' | 'stacked';
  readonly layers: readonly TableLayer[];
}

/** What of a table's content decides its plan. */
type PlannedContent = Pick<StratifiedTableContent, 'show' | 'layout' | 'pValues'>;

/** More figure columns than this don't fit a portrait page. */
const MOST_COLUMNS = 8;

/** More strata than this are always stacked. */
const MOST_STRATA_BESIDE = 2;

/**
 * Plans a table. The framing chooses among the effect columns: differences, ratios, or both with
 * the differences first; counts and risks stay in every framing. The arrangement never depends on
 * the framing, so that toggling it moves no rows. Estimates from elsewhere stand beside the
 * crude ones: where layers are below each other, they bring the rows of all strata along.
 */
export function planTable(
  content: PlannedContent,
  result: AnalysisResult,
  framing: Framing,
  outsideColumns = 0,
): TablePlan {
  const arrangement = arrangementOf(content, result, outsideColumns);
  const columns = columnsOf(content, result, framing);
  const needsCrude = outsideColumns > 0 && arrangement === 'stacked';
  const scopes = scopesOf(needsCrude ? { ...content.show, crude: true } : content.show, result);
  return { arrangement, layers: scopes.map((scope) => layerOf(scope, columns, arrangement)) };
}

/** The effect columns of a framing; a framing that would leave none shows all that are on. */
export function effectColumns(
  show: TableChoice,
  result: AnalysisResult,
  framing: Framing,
): readonly EffectMeasureId[] {
  if (!designGivesRisk(result.frame.design)) return ['oddsRatio'];
  const on = EFFECT_COLUMNS.filter((measure) => show[measure]);
  const said = on.filter((measure) => SAID[framing].includes(measure));
  return said.length === 0 ? on : said;
}

const EFFECT_COLUMNS = ['riskDifference', 'riskRatio', 'oddsRatio'] as const;

const SAID: Readonly<Record<Framing, readonly EffectMeasureId[]>> = {
  absolute: ['riskDifference'],
  both: EFFECT_COLUMNS,
  relative: ['riskRatio', 'oddsRatio'],
};

interface CountColumn {
  readonly id: TableColumnId;
  readonly isShare: boolean;
}

const GROUP_COLUMNS: readonly CountColumn[] = [
  { id: 'count', isShare: false },
  { id: 'share', isShare: true },
];

/** Cases and controls are counted down their columns, as their sampling asks. */
const SAMPLE_COLUMNS: readonly CountColumn[] = [
  { id: 'cases', isShare: false },
  { id: 'casesShare', isShare: true },
  { id: 'controls', isShare: false },
  { id: 'controlsShare', isShare: true },
];

function columnsOf(
  { show, pValues = 'none' }: PlannedContent,
  result: AnalysisResult,
  framing: Framing,
): readonly TableColumnId[] {
  const counts = designGivesRisk(result.frame.design) ? GROUP_COLUMNS : SAMPLE_COLUMNS;
  const shown = counts.filter(({ isShare }) => show.risk || !isShare).map(({ id }) => id);
  const tests = pValues === 'none' ? [] : (['pValue'] as const);
  return [...shown, ...effectColumns(show, result, framing), ...tests];
}

function scopesOf(show: TableChoice, result: AnalysisResult): readonly ResultScope[] {
  if (result.strata.length === 0) return [{ kind: 'crude' }];
  const strata = result.frame.strata.map(({ id }) => ({ kind: 'stratum', stratumId: id }) as const);
  const crude = show.crude ? [{ kind: 'crude' } as const] : [];
  const pooled = show.pooled && result.pooled.length > 0 ? [{ kind: 'pooled' } as const] : [];
  return [...strata, ...crude, ...pooled];
}

function arrangementOf(
  content: PlannedContent,
  result: AnalysisResult,
  outsideColumns: number,
): TablePlan['arrangement'] {
  const { show, layout } = content;
  if (result.strata.length === 0) return 'plain';
  if (layout !== 'auto') return layout;
  const columns = columnsOf(content, result, 'both');
  const widths = scopesOf(show, result).map(
    (scope) => layerOf(scope, columns, 'sideBySide').columns.length,
  );
  const total = widths.reduce((sum, width) => sum + width, outsideColumns);
  const fits = result.strata.length <= MOST_STRATA_BESIDE && total <= MOST_COLUMNS;
  return fits ? 'sideBySide' : 'stacked';
}

/** Beside the strata, pooled estimates have columns of their own, and no counts to repeat. */
function layerOf(
  scope: ResultScope,
  columns: readonly TableColumnId[],
  arrangement: TablePlan['arrangement'],
): TableLayer {
  const effectsOnly = scope.kind === 'pooled' && arrangement === 'sideBySide';
  return { scope, columns: effectsOnly ? columns.filter(isOfContrast) : columns };
}

function isOfContrast(column: TableColumnId): boolean {
  return column === 'pValue' || EFFECT_COLUMNS.some((measure) => measure === column);
}
