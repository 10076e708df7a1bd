import { inject, Injectable } from '@angular/core';
import {
  analysisIdsOf,
  type Block,
  fieldValue,
  type PinnedAnalysis,
  type Step,
  withFieldValue,
} from '#shared/report';
import type { AnalysisView } from '#shared/api';
import { CurrentStudy } from '../../session/current-study';
import { Dialogs } from '../../ui/dialog/dialogs';
import { Notices } from '../../ui/notices/notices';
import { BlockActions } from '../block-actions/block-actions';
import { pinnedAnalysisOf } from '../block-actions/pinned-analysis-of';
import { kindOf } from '../block-editors/block-content';
import { ReportState } from '../report-store/report-state';
import { ReportStore } from '../report-store/report-store';
import { ReportSync } from '../report-store/report-sync';
import { ReverseContrastDialog, type ReverseRequest } from './reverse-contrast-dialog';

/**
 * Makes another level the reference of an analysis. It is an edit of the analysis: table, figure
 * and sentences turn together, and the report moves to the new result.
 */
@Injectable()
export class ReverseContrast {
  private readonly store = inject(ReportStore);
  private readonly state = inject(ReportState);
  private readonly sync = inject(ReportSync);
  private readonly actions = inject(BlockActions);
  private readonly study = inject(CurrentStudy);
  private readonly dialogs = inject(Dialogs);
  private readonly notices = inject(Notices);

  /** Whether a block shows one analysis that this person may edit. Reads signals. */
  possible(blockId: string): boolean {
    return this.study.may('editData') && this.pinOf(blockId) !== null;
  }

  reverse(blockId: string): void {
    const pin = this.pinOf(blockId);
    const studyId = this.study.study()?.id;
    if (pin === null || studyId === undefined || !this.study.may('editData')) return;
    const request: ReverseRequest = { studyId, pin, levelId: this.chosenLevel(blockId) };
    this.dialogs.open<AnalysisView>(ReverseContrastDialog, request).subscribe((changed) => {
      this.turn(pin, changed);
    });
  }

  /** Sentences that spoke of the new reference now speak of the old one. */
  private turn(before: PinnedAnalysis, changed: AnalysisView): void {
    const now = pinnedAnalysisOf(changed);
    this.state.takeResult(now);
    const oldReference = before.result.frame.exposure.referenceLevelId;
    const newReference = now.result.frame.exposure.referenceLevelId;
    const steps = this.store
      .blocks()
      .flatMap((block) => turned(block, before.analysisId, newReference, oldReference));
    if (steps.length > 0) this.actions.make(steps);
    this.sync.look();
    this.notices.say(`${now.number} is turned round: table, figure and sentences follow.`);
  }

  private pinOf(blockId: string): PinnedAnalysis | null {
    const block = this.store.block(blockId);
    const [only, ...others] = block === undefined ? [] : analysisIdsOf(block);
    if (only === undefined || others.length > 0) return null;
    return this.state.pins().get(only) ?? null;
  }

  /** The level that a sentence speaks of is the one to begin with. */
  private chosenLevel(blockId: string): string | null {
    const block = this.store.block(blockId);
    const path = block === undefined ? undefined : levelPath(block);
    const level = path === undefined ? null : fieldValue(block?.content, path);
    return typeof level === 'string' ? level : null;
  }
}

function turned(
  block: Block,
  analysisId: string,
  newReference: string,
  oldReference: string,
): readonly Step[] {
  const path = levelPath(block);
  const shows = analysisIdsOf(block).includes(analysisId);
  if (path === undefined || !shows || fieldValue(block.content, path) !== newReference) return [];
  const content = withFieldValue(block.content, path, oldReference);
  return [{ kind: 'replaceContent', blockId: block.id, baseVersion: block.version, content }];
}

function levelPath(block: Block): string | undefined {
  return kindOf(block)?.fields.find((field) => field.kind === 'indexLevel')?.path;
}
