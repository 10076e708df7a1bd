import {
  type AddressedQuantity,
  type AnalysisResult,
  findGuards,
  type GuardFinding,
  type GuardId,
  type GuardSeverity,
} from '#shared/analysis';
import type { HouseStyle } from '#shared/house-style';
import type { PinnedAnalysis } from '#shared/report';
import { guardWords, type Phrasebook } from '#shared/wording';
import { counted } from '../../ui/words';
import type { PrintedBlock } from '../proof/printed-block';
import { samePlace } from '../margins/block-sources';
import type { ProofCheck } from './proof-check';

/** What the words of a guard are said under. */
export interface GuardPrint {
  readonly houseStyle: HouseStyle;
  readonly phrasebook: Phrasebook;
}

/** More cautions than this beside one block are counted, not shown. */
const MOST_SHOWN = 3;

const WEIGHTS: Readonly<Record<GuardSeverity, ProofCheck['weight']>> = {
  refusal: 'problem',
  caution: 'caution',
  note: 'quiet',
};

/**
 * What the guards of an analysis say beside a block, one note for each guard. Each is said at the
 * first block that it matters to, and again where a block prints the very comparison that it speaks
 * of. `seen` holds what was said beside earlier blocks; this adds to it.
 */
export function guardChecks(
  blockId: string,
  printed: PrintedBlock,
  pin: PinnedAnalysis,
  under: GuardPrint & { readonly seen: Set<string> },
): readonly ProofCheck[] {
  const matters = findingsOf(pin.result).filter(({ guardId }) => mattersTo(guardId, printed));
  const relevant = matters.filter(
    (each) => !under.seen.has(seenKey(each, pin)) || concerns(each, printed, pin),
  );
  for (const finding of relevant) under.seen.add(seenKey(finding, pin));
  const guardIds = [...new Set(relevant.map(({ guardId }) => guardId))];
  const checks = guardIds.map((guardId) => {
    const same = relevant.filter((finding) => finding.guardId === guardId);
    return check(blockId, pin, { guardId, same }, under);
  });
  return [...checks.slice(0, MOST_SHOWN), ...rest(blockId, pin, checks.slice(MOST_SHOWN))];
}

/** All places of a guard are said together. */
function seenKey({ guardId }: GuardFinding, { analysisId }: PinnedAnalysis): string {
  return `${analysisId}/${guardId}`;
}

/** A caution about odds ratios is none where no odds ratio is printed. */
function mattersTo(guardId: GuardId, { bound }: PrintedBlock): boolean {
  const quantity = ABOUT[guardId];
  return quantity === undefined || bound.some(({ address }) => address.quantity === quantity);
}

const ABOUT: Readonly<Partial<Record<GuardId, AddressedQuantity>>> = { commonOutcome: 'oddsRatio' };

interface SameGuard {
  readonly guardId: GuardId;
  readonly same: readonly GuardFinding[];
}

function check(
  blockId: string,
  pin: PinnedAnalysis,
  { guardId, same }: SameGuard,
  { houseStyle, phrasebook }: GuardPrint,
): ProofCheck {
  const [first, ...others] = same as readonly [GuardFinding, ...GuardFinding[]];
  const { title, sentence } = guardWords(first, pin, houseStyle, phrasebook);
  const more =
    others.length === 0
      ? ''
      : ` The same at ${counted(others.length, 'other place', 'other places')}.`;
  const weight = WEIGHTS[first.severity];
  return {
    id: `${blockId}/guard/${pin.analysisId}/${guardId}`,
    blockId,
    weight,
    tag: pin.number,
    subject: title,
    text: weight === 'quiet' ? `${pin.number}: ${title}` : sentence + more,
    detail: sentence + more,
    anchor: null,
    remedies: [{ kind: 'analysis', label: 'Open the analysis', analysisId: pin.analysisId }],
  };
}

function rest(
  blockId: string,
  { analysisId, number }: PinnedAnalysis,
  checks: readonly ProofCheck[],
): readonly ProofCheck[] {
  if (checks.length === 0) return [];
  const words = `${counted(checks.length, 'further caution', 'further cautions')} in ${number}`;
  return [
    {
      id: `${blockId}/guard/${analysisId}/rest`,
      blockId,
      weight: 'quiet',
      tag: number,
      subject: words,
      text: words,
      detail: checks.map(({ subject }) => subject).join('. '),
      anchor: null,
      remedies: [{ kind: 'analysis', label: 'Open the analysis', analysisId }],
    },
  ];
}

/** Whether a block prints an effect at the very place that a guard speaks of. */
function concerns(finding: GuardFinding, { bound }: PrintedBlock, pin: PinnedAnalysis): boolean {
  const { place, severity } = finding;
  if (severity === 'note' || place.levelId === null) return false;
  const effects = bound.filter(
    ({ address }) =>
      address.analysisId === pin.analysisId &&
      address.facet !== 'value' &&
      address.quantity !== 'risk',
  );
  return effects.length > 0 && effects.every(({ address }) => samePlace(address, place));
}

const FOUND = new WeakMap<AnalysisResult, readonly GuardFinding[]>();

/** A result never changes, and neither does what the guards find in it. */
function findingsOf(result: AnalysisResult): readonly GuardFinding[] {
  const findings = FOUND.get(result) ?? findGuards(result);
  FOUND.set(result, findings);
  return findings;
}
