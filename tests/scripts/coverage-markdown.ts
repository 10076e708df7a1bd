import { COMPARED, SIZES } from './coverage-grid';
import type { ComparedEstimand, Coverage } from './coverage-grid';

/** Where the help topic stands. */
export const COVERAGE_TOPIC = 'client/src/app/help/topics/coverage.md';

/** The help topic, word for word; takes minutes for the heavy methods. */
export function coverageTopic(): string {
  return `${[INTRODUCTION, ...COMPARED.map(section), READING].join('\n\n')}\n`;
}

/** A method's row: mean and least coverage, and width, for each size; the shares without limits. */
export function coverageRow(
  estimand: ComparedEstimand,
  method: ComparedEstimand['methods'][number],
  sizes: readonly number[],
): readonly string[] {
  const found = sizes.map((size) => estimand.coverageOf(method.id, size));
  const cells = found.flatMap((one) => [coverageCell(one), widthCell(estimand, one)]);
  return [method.label, ...cells, found.map(({ without }) => percent(without, 0)).join(', ')];
}

function section(estimand: ComparedEstimand): string {
  const width = estimand.isRatio ? 'factor' : 'width';
  const head = ['Method', ...SIZES.flatMap((size) => [`n = ${size}`, width]), 'No limits'];
  const rows = estimand.methods.map((method) => coverageRow(estimand, method, SIZES));
  const rule = head.map((_, place) => (place === 0 ? '---' : '--:'));
  const lines = [head, rule, ...rows].map((cells) => `| ${cells.join(' | ')} |`);
  return [`### ${estimand.title}`, lines.join('\n')].join('\n\n');
}

/** "95.6 (92.1)": mean and least coverage in per cent, the least rounded down. */
function coverageCell({ mean, least }: Coverage): string {
  return `${percent(mean, 1)} (${(Math.floor(least * 1000 + 1e-6) / 10).toFixed(1)})`;
}

/** Widths of shares in percentage points; of ratios the mean factor from limit to limit. */
function widthCell({ isRatio }: ComparedEstimand, { width }: Coverage): string {
  return isRatio ? Math.exp(width).toPrecision(3) : (width * 100).toFixed(1);
}

function percent(share: number, decimals: number): string {
  return (share * 100).toFixed(decimals);
}

const INTRODUCTION = [
  '## Intervals compared',
  'How often do limits at the level 95% hold the true value? Every figure is a sum over all tables ' +
    'that two groups of n each can give (for a risk: one group), exact and not simulated. First ' +
    'the mean over true risks from 2% to 50%, in brackets the least; then the mean width, for ' +
    'risks and differences in percentage points, for ratios as the factor from limit to limit. ' +
    '_No limits_: how often, in per cent, the table is one for which the method is not defined, ' +
    'for each n. Those are left out of the coverage; ratios from 0 or to infinity are left out of ' +
    'the width.',
].join('\n\n');

const READING = [
  '**Why the defaults are what they are.** Wilson for a risk and Newcombe for a difference hold ' +
    'close to 95% even in small groups, need no search, and can be checked by hand from the ' +
    'printed counts; the plain Wald interval falls far below. For ratios the log intervals of ' +
    'Katz and Woolf are what readers know and can recompute. With few events they are at their ' +
    'worst, and with a zero they give nothing: take a score interval there, which bounds the ' +
    'ratio from one side.',
  '**Exact** methods never fall below 95%, and pay for it in width. Choose them where that ' +
    'guarantee was asked for, before you see the results.',
].join('\n\n');
