import type { ResultScope, ValueAddress } from '#shared/analysis';
import { EFFECT_MEASURE_IDS } from '#shared/effects/measure-ids';
import type { PinnedAnalysis } from '#shared/report';
import { shortDate } from '../../ui/dates';
import { counted } from '../../ui/words';
import type { PrintedBlock } from '../proof/printed-block';
import { methodLines } from './method-lines';

/** Where the numbers of a block come from, in the words of the left margin. */
export interface BlockSources {
  readonly analysisIds: readonly string[];
  /** "A2, hospital ward" */
  readonly name: string;
  /** At most three short lines. */
  readonly lines: readonly string[];
  readonly count: SourceCount;
}

/** How many numbers of a block have a source, and how many have none. */
export interface SourceCount {
  readonly bound: number;
  readonly typed: number;
  readonly missing: number;
}

const MOST_LINES = 3;

/** The sources of a block; null for a block without any number. */
export function blockSources(
  printed: PrintedBlock,
  pins: ReadonlyMap<string, PinnedAnalysis>,
): BlockSources | null {
  const count = countSources(printed);
  if (count.bound + count.typed + count.missing === 0) return null;
  const addresses = printed.bound.map((number) => number.address);
  const analysisIds = [...new Set(addresses.map((address) => address.analysisId))];
  const shown = analysisIds.flatMap((id) => pins.get(id) ?? []);
  const [only, ...others] = shown;
  return {
    analysisIds,
    name: only === undefined ? 'No source' : nameOf(only, others, addresses),
    lines: linesOf(shown, addresses).slice(0, MOST_LINES),
    count,
  };
}

/** "36 of 36 numbers bound"; of a hundred and more the noun finds no room. */
export function countWords({ bound, typed, missing }: SourceCount): string {
  const all = bound + typed + missing;
  if (all >= 100) return `${bound} of ${all} bound`;
  return `${bound} of ${counted(all, 'number', 'numbers')} bound`;
}

function countSources({ bound, typed, missing }: PrintedBlock): SourceCount {
  return { bound: bound.length, typed: typed.length, missing };
}

function nameOf(
  only: PinnedAnalysis,
  others: readonly PinnedAnalysis[],
  addresses: readonly ValueAddress[],
): string {
  if (others.length > 0) return [only, ...others].map((pin) => pin.number).join(' and ');
  const contrast = onlyContrast(addresses);
  const place = contrast === null ? only.name : lowered(scopeWords(contrast.scope, only));
  return `${only.number}, ${place}`;
}

function linesOf(
  shown: readonly PinnedAnalysis[],
  addresses: readonly ValueAddress[],
): readonly string[] {
  const [only, ...others] = shown;
  const cuts = [...new Set(shown.map(cutWords))];
  if (only === undefined || others.length > 0) return cuts;
  const contrast = onlyContrast(addresses);
  return contrast === null
    ? [...cuts, ...methodLines(only, addresses)]
    : [contrastWords(contrast.levelId, only), ...cuts];
}

function cutWords({ cut }: PinnedAnalysis): string {
  return `Cut ${cut.number}, ${shortDate(cut.dataDate)}`;
}

interface OnlyContrast {
  readonly levelId: string;
  readonly scope: ResultScope;
}

/** The contrast of a block that speaks of one level against the reference, at one place only. */
function onlyContrast(addresses: readonly ValueAddress[]): OnlyContrast | null {
  const effects = addresses.filter(({ quantity }) =>
    EFFECT_MEASURE_IDS.some((measure) => measure === quantity),
  );
  const [first] = effects;
  if (first?.levelId === undefined || first.levelId === null) return null;
  return effects.every((address) => samePlace(address, first))
    ? { levelId: first.levelId, scope: first.scope }
    : null;
}

type Place = Pick<ValueAddress, 'levelId' | 'scope'>;

/** Whether two values are about the same level in the same people. */
export function samePlace(one: Place, other: Place): boolean {
  return (
    one.levelId === other.levelId &&
    one.scope.kind === other.scope.kind &&
    stratumOf(one.scope) === stratumOf(other.scope)
  );
}

function stratumOf(scope: ResultScope): string | null {
  return scope.kind === 'stratum' ? scope.stratumId : null;
}

function scopeWords(scope: ResultScope, { result }: PinnedAnalysis): string {
  switch (scope.kind) {
    case 'crude':
      return result.frame.strata.length === 0 ? `all ${result.frame.peopleNoun}` : 'crude';
    case 'pooled':
      return 'pooled over strata';
    case 'stratum':
      return result.frame.strata.find(({ id }) => id === scope.stratumId)?.label ?? 'one stratum';
  }
}

function contrastWords(levelId: string, { result }: PinnedAnalysis): string {
  const { levels, referenceLevelId } = result.frame.exposure;
  const labelOf = (id: string): string => levels.find((level) => level.id === id)?.label ?? id;
  return `${labelOf(levelId)} against ${lowered(labelOf(referenceLevelId))}`;
}

/** "None" becomes "none"; names that hold capitals or digits stay as they are. */
function lowered(label: string): string {
  return /^\p{Lu}[\p{Ll}\s]*$/u.test(label) ? label.toLowerCase() : label;
}

/**
 * The table or figure whose numbers a block repeats, in the same figures: "Table 2". `places` says
 * which captioned block prints a value first.
 */
export function inStepWith(
  blockId: string,
  blocks: ReadonlyMap<string, PrintedBlock>,
  places: ReadonlyMap<string, string>,
): string | null {
  const own = blocks.get(blockId);
  const keys = [...(own?.figures.keys() ?? [])];
  const otherId = keys.map((key) => places.get(key)).find((id) => id && id !== blockId);
  const other = blocks.get(otherId ?? '');
  if (own === undefined || other === undefined || other.caption === null) return null;
  const shared = keys.filter((key) => other.figures.has(key));
  const agree = shared.every((key) => other.figures.get(key) === own.figures.get(key));
  return agree ? `${other.caption.label} ${other.caption.number}` : null;
}
