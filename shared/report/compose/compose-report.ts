import type { ComposedReport, LayoutElement } from '#shared/layout';
import type { HouseStyle } from '#shared/house-style';
import type { Phrasebook } from '#shared/wording';
import type { PinnedAnalyses, PrintSetting } from '../blocks/block-context';
import { visibleBlocks } from '../order';
import type { PinnedAnalysis, Report } from '../report';
import { createBlockMemory } from './block-memory';
import type { BlockMemory } from './block-memory';
import { createFinisher } from './finish-report';
import type { Finisher } from './finish-report';

/** What a composed report is made of. `pins` are the analyses with the results they show. */
export interface ComposeRequest {
  readonly report: Report;
  readonly pins: Iterable<PinnedAnalysis>;
  readonly houseStyle: HouseStyle;
  readonly phrasebook: Phrasebook;
}

/** Composes a report again and again, doing only what a change asks for. */
export interface Composer {
  compose(request: ComposeRequest): ComposedReport;
}

/**
 * A composer with a memory. A block is composed again only when its own object, the framing, the
 * house style, the phrasebook or the result of an analysis that it shows is another than before;
 * unchanged elements come out as the same objects, so that a view needs to draw only the others.
 */
export function createComposer(): Composer {
  const memory = createBlockMemory();
  const finish = createFinisher();
  return { compose: (request) => composeWith(request, memory, finish) };
}

/** Composes a report once. */
export function composeReport(request: ComposeRequest): ComposedReport {
  return createComposer().compose(request);
}

function composeWith(
  request: ComposeRequest,
  memory: BlockMemory,
  finish: Finisher,
): ComposedReport {
  const setting: PrintSetting = {
    framing: request.report.framing,
    houseStyle: request.houseStyle,
    phrasebook: request.phrasebook,
    pins: pinsInForce(request),
  };
  const drafted: readonly LayoutElement[] = visibleBlocks(request.report).flatMap((block) =>
    memory.elementsOf(block, setting),
  );
  return finish(request.report.title, drafted, request.phrasebook);
}

/**
 * A pinned analysis that carries another result than the report names would show stale numbers. One
 * that the report doesn't name yet is about to be pinned with the block that shows it.
 */
function pinsInForce({ report, pins }: ComposeRequest): PinnedAnalyses {
  const inForce = [...pins].filter(({ analysisId, resultId }) => {
    const named = report.pins[analysisId];
    return named === undefined || named === resultId;
  });
  return new Map(inForce.map((pin) => [pin.analysisId, pin]));
}
