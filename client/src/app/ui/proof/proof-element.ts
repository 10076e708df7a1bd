import { NgTemplateOutlet } from '@angular/common';
import {
  ChangeDetectionStrategy,
  Component,
  contentChild,
  Directive,
  inject,
  input,
  output,
  TemplateRef,
} from '@angular/core';
import type { FigureElement, LayoutElement, ListElement } from '#shared/layout';
import { Icon } from '../marks/icon';
import { type NestedList, nestedList } from './nested-list';
import { ProofList } from './proof-list';
import { ProofRuns } from './proof-runs';
import { ProofTable } from './proof-table';

/** Marks how a page draws figures: the template gets the figure element as `let-figure`. */
@Directive({ selector: 'ng-template[ehProofFigure]' })
export class ProofFigure {
  readonly template = inject<TemplateRef<{ $implicit: FigureElement }>>(TemplateRef);
}

/**
 * Draws one layout element as the proof shows it. The chart of a figure comes from the page, as its
 * code is large and loaded late; caption, notes and alternative text are drawn here.
 *
 * ```html
 * <eh-proof-element [element]="element">
 *   <ng-template ehProofFigure let-figure><eh-chart [figure]="figure.figure" /></ng-template>
 * </eh-proof-element>
 * ```
 */
@Component({
  selector: 'eh-proof-element',
  imports: [Icon, NgTemplateOutlet, ProofList, ProofRuns, ProofTable],
  templateUrl: './proof-element.html',
  styleUrl: './proof-element.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ProofElement {
  readonly element = input.required<LayoutElement>();
  readonly referenceFollowed = output<string>();

  protected readonly figureSlot = contentChild(ProofFigure);

  protected nested(list: ListElement): NestedList {
    return nestedList(list);
  }
}
