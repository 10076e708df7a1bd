import { computed, inject, Injectable } from '@angular/core';
import { addressKey, parseAddress, type ValueAddress } from '#shared/analysis';
import type { HouseStyle } from '#shared/house-style';
import type { LayoutElement } from '#shared/layout';
import { boundText, formatsOf, type PinnedAnalysis } from '#shared/report';
import { type BoundValueFormat, textOfBound } from '#shared/report/text';
import type { Phrasebook } from '#shared/wording';
import { PHRASEBOOK } from '../../ui/phrasebook';
import { ReportState } from '../report-store/report-state';
import type { AtomText, AtomWords } from '../text-editor/atom-words';
import { captionOf } from './printed-block';
import { ReportProof } from './report-proof';

/** A table or a figure that words can refer to. */
export interface ProofReference {
  readonly blockId: string;
  /** "Table 2" */
  readonly name: string;
  readonly title: string;
}

/** A way to print a value, and what it then prints. */
export interface PrintedFormat {
  readonly format: BoundValueFormat;
  readonly text: string;
}

interface Print {
  readonly pins: ReadonlyMap<string, PinnedAnalysis>;
  readonly houseStyle: HouseStyle;
  readonly phrasebook: Phrasebook;
}

/** What single values and references print at the moment, outside of whole blocks. */
@Injectable()
export class ProofWords {
  private readonly state = inject(ReportState);
  private readonly proof = inject(ReportProof);
  private readonly phrasebook = inject(PHRASEBOOK);

  readonly references = computed((): readonly ProofReference[] =>
    (this.proof.composed()?.elements ?? []).flatMap(referenceTo),
  );

  /** Words for the atoms of a text; another object whenever they may print something else. */
  readonly atoms = computed((): AtomWords => {
    const print = this.print();
    const references = new Map(this.references().map((each) => [each.blockId, each.name]));
    return {
      valueOf: (key, format) => valueText(key, format, print),
      referenceOf: (blockId) => referenceText(references.get(blockId)),
    };
  });

  /** What a value prints on its own, as a value of a picker or of a note. */
  textOf(address: ValueAddress, format: BoundValueFormat = 'auto'): string {
    const print = this.print();
    return print === null ? '' : textOfBound(boundText(addressKey(address), format, print));
  }

  /** The ways to print a value that differ from each other. */
  formatsOf(key: string): readonly PrintedFormat[] {
    const print = this.print();
    const address = parseAddress(key);
    if (print === null || !address.ok) return [];
    const all = formatsOf(address.value).map((format) => ({
      format,
      text: textOfBound(boundText(key, format, print)),
    }));
    return all.filter(
      ({ text }, index) => all.findIndex((earlier) => earlier.text === text) === index,
    );
  }

  private readonly print = computed((): Print | null => {
    const houseStyle = this.state.houseStyle();
    if (houseStyle === null) return null;
    return { pins: this.state.pins(), houseStyle, phrasebook: this.phrasebook };
  });
}

function valueText(key: string, format: BoundValueFormat, print: Print | null): AtomText {
  if (print === null) return { text: '…', spoken: 'a value', state: 'bound' };
  const bound = boundText(key, format, print);
  const text = textOfBound(bound);
  const analysisId = bound.parts.flatMap((part) => part.addresses)[0]?.analysisId ?? '';
  const source = print.pins.get(analysisId)?.number;
  const tie = source === undefined ? 'its source is gone' : `bound to ${source}`;
  return { text, spoken: `${text}, ${tie}`, state: bound.state };
}

function referenceText(name: string | undefined): AtomText {
  if (name !== undefined) return { text: name, spoken: `${name}, a reference`, state: 'bound' };
  const text = '[table or figure removed]';
  return { text, spoken: text, state: 'missing' };
}

function referenceTo(element: LayoutElement): readonly ProofReference[] {
  const caption = captionOf(element);
  if (caption === null) return [];
  const title = caption.runs.map((run) => run.text).join('');
  return [{ blockId: element.blockId, name: `${caption.label} ${String(caption.number)}`, title }];
}
