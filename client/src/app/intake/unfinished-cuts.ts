import { Injectable } from '@angular/core';
import type { CodeBook } from '#shared/code-book';
import { remembered } from '../ui/remembered';

/** A cut that was left for later: the upload it is made of, and what was settled so far. */
export interface UnfinishedCut {
  readonly studyId: string;
  readonly uploadId: string;
  readonly fileName: string;
  readonly dataSetId: string | null;
  readonly dataSetName: string;
  readonly dataDate: string;
  readonly codeBook: CodeBook | null;
  readonly savedAt: string;
}

/** Cuts that this browser holds unfinished; the files themselves wait on the server. */
@Injectable({ providedIn: 'root' })
export class UnfinishedCuts {
  private readonly kept = remembered<readonly UnfinishedCut[]>(
    'evenhand.unfinished-cuts',
    [],
    (value) => (Array.isArray(value) ? value.filter(isUnfinishedCut) : []),
  );

  of(studyId: string): readonly UnfinishedCut[] {
    return this.kept().filter((cut) => cut.studyId === studyId);
  }

  find(uploadId: string): UnfinishedCut | null {
    return this.kept().find((cut) => cut.uploadId === uploadId) ?? null;
  }

  keep(cut: UnfinishedCut): void {
    this.kept.update((cuts) => [cut, ...cuts.filter(({ uploadId }) => uploadId !== cut.uploadId)]);
  }

  forget(uploadId: string): void {
    this.kept.update((cuts) => cuts.filter((cut) => cut.uploadId !== uploadId));
  }
}

function isUnfinishedCut(value: unknown): value is UnfinishedCut {
  const cut = value as Partial<UnfinishedCut> | null;
  return (
    typeof cut?.studyId === 'string' &&
    typeof cut.uploadId === 'string' &&
    typeof cut.fileName === 'string'
  );
}
