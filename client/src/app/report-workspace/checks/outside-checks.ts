import { checkOutsideEstimate } from '#shared/outside-estimates';
import type { OutsideEstimate, OutsideFinding, OutsideFindingId } from '#shared/outside-estimates';
import type { PinnedAnalysis } from '#shared/report';
import { outsideFindingWords, outsideMeasureName } from '#shared/wording';
import type { PrintedBlock } from '../proof/printed-block';
import type { GuardPrint } from './guard-checks';
import type { ProofCheck } from './proof-check';

/** What keeps an estimate from being shown; said once, as no block prints it. */
const HIDES: readonly OutsideFindingId[] = ['referenceChanged', 'levelGone'];

/**
 * What the checks of estimates from elsewhere say beside a block: of those that it prints, and once
 * in a report (`seen`) of those that nothing shows because the analysis compares otherwise now.
 */
export function outsideChecks(
  blockId: string,
  { bound }: PrintedBlock,
  pin: PinnedAnalysis,
  under: GuardPrint & { readonly seen: Set<string> },
): readonly ProofCheck[] {
  const printed = new Set(bound.flatMap(({ address }) => address.estimateId ?? []));
  return (pin.outside ?? []).flatMap((estimate) => {
    const findings = checkOutsideEstimate(estimate, pin.result);
    const hidden = findings.filter(({ id }) => HIDES.includes(id));
    const isNew = hidden.length > 0 && !under.seen.has(estimate.id);
    if (isNew) under.seen.add(estimate.id);
    const said = printed.has(estimate.id) ? findings : isNew ? hidden : [];
    return said.map((finding) => check(blockId, { pin, estimate, finding }, under));
  });
}

interface Found {
  readonly pin: PinnedAnalysis;
  readonly estimate: OutsideEstimate;
  readonly finding: OutsideFinding;
}

function check(
  blockId: string,
  { pin, estimate, finding }: Found,
  { houseStyle, phrasebook }: GuardPrint,
): ProofCheck {
  const { analysisId, number } = pin;
  const words = outsideFindingWords(finding, houseStyle, phrasebook);
  const subject = `Adjusted ${outsideMeasureName(estimate.measure, pin, phrasebook)}`;
  const quiet = finding.severity === 'note';
  return {
    id: `${blockId}/outside/${estimate.id}/${finding.id}`,
    blockId,
    weight: quiet ? 'quiet' : 'caution',
    tag: number,
    subject,
    text: quiet ? `${number}: ${subject}, computed elsewhere` : words,
    detail: words,
    anchor: null,
    remedies: [{ kind: 'analysis', label: 'Open the analysis', analysisId }],
  };
}
