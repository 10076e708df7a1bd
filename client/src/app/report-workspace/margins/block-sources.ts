import { addressKey, type ResultScope, type ValueAddress } from '#shared/analysis';
import { EFFECT_MEASURE_IDS } from '#shared/effects/measure-ids';
import type { FigureElement, LayoutElement, TableElement } from '#shared/layout';
import { type PinnedAnalysis, runsOf } from '#shared/report';
import { shortDate } from '../../ui/dates';
import { counted } from '../../ui/words';
import type { PrintedBlock } from '../proof/report-proof';
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

/** "36 of 36 numbers bound" */
export function countWords({ bound, typed, missing }: SourceCount): string {
  const all = bound + typed + missing;
  return `${bound} of ${counted(all, 'number', 'numbers')} bound`;
}

function countSources({ bound, elements }: PrintedBlock): SourceCount {
  const states = elements.flatMap(runsOf).map((run) => run.origin?.state);
  return {
    bound: bound.length,
    typed: states.filter((state) => state === 'typed').length,
    missing: states.filter((state) => state === 'missing').length,
  };
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
  const place = placeKey(first);
  return effects.every((address) => placeKey(address) === place)
    ? { levelId: first.levelId, scope: first.scope }
    : null;
}

function placeKey(address: ValueAddress): string {
  return addressKey({ ...address, quantity: 'total', facet: 'value' });
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

type CaptionedElement = TableElement | FigureElement;

function hasCaption(element: LayoutElement): element is CaptionedElement {
  return element.kind === 'table' || element.kind === 'figure';
}

/** The table or figure whose numbers a block repeats, in the same figures. */
export function inStepWith(
  printed: PrintedBlock,
  others: Iterable<readonly [string, PrintedBlock]>,
): CaptionedElement | null {
  const own = new Map(printed.bound.map(({ address, text }) => [addressKey(address), bare(text)]));
  for (const [, other] of others) {
    const captioned = other.elements.find(hasCaption);
    if (captioned === undefined || other === printed) continue;
    const shared = other.bound.filter(({ address }) => own.has(addressKey(address)));
    const agree = shared.every(({ address, text }) => own.get(addressKey(address)) === bare(text));
    if (shared.length > 0 && agree) return captioned;
  }
  return null;
}

/** Figures without the signs that a table's head says once for all of its cells. */
function bare(text: string): string {
  return text.replace(/^\+|\s*%$/gu, '');
}
