import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { RouterLink } from '@angular/router';
import { findGuards, type GuardFinding, type GuardSeverity } from '#shared/analysis';
import { guardWords, type GuardWords } from '#shared/wording';
import { MarginNote, type NoteTone } from '../../ui/status/margin-note';
import { BenchStore } from '../bench/bench-store';
import { sameScope } from '../bench/result-scopes';
import type { BenchPrint } from '../print/bench-print';

const TONES: Readonly<Record<GuardSeverity, NoteTone>> = {
  refusal: 'problem',
  caution: 'caution',
  note: 'clear',
};

const TAGS: Readonly<Record<GuardSeverity, string>> = {
  refusal: 'Stop',
  caution: 'Caution',
  note: 'Note',
};

/** Guards that the code book can answer. */
const CODE_BOOK_GUARDS: readonly string[] = ['levelsOutOfOrder', 'orderedAsUnordered'];

/** This one stands beside its cause, the study's design. */
const SAID_BELOW_THE_SENTENCE = 'noRiskByDesign';

interface GuardNote {
  readonly finding: GuardFinding;
  readonly words: GuardWords;
}

/** What one guard found at several places. */
interface GuardGroup {
  readonly title: string;
  readonly source: string;
  readonly sentences: readonly string[];
  readonly tone: NoteTone;
  readonly tag: string;
  readonly isAboutCodeBook: boolean;
}

/** What the guards say about the result, in plain words, with where each rule comes from. */
@Component({
  selector: 'eh-guards-panel',
  imports: [MarginNote, RouterLink],
  templateUrl: './guards-panel.html',
  styleUrl: './guards-panel.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class GuardsPanel {
  protected readonly store = inject(BenchStore);
  protected readonly showsAll = signal(false);

  private readonly notes = computed<readonly GuardNote[]>(() => {
    const print = this.store.print();
    if (print === null) return [];
    const context = { repeatedIdentifiers: this.store.repeatedIdentifiers() };
    return findGuards(print.result, context)
      .filter(({ guardId }) => guardId !== SAID_BELOW_THE_SENTENCE)
      .map((finding) => noteOf(print, finding));
  });
  /** What is about the whole, or about the layer in view. */
  private readonly here = computed(() => this.notes().filter((note) => this.isHere(note)));
  protected readonly shown = computed(() => grouped(this.showsAll() ? this.notes() : this.here()));
  protected readonly elsewhere = computed(() => this.notes().length - this.here().length);
  protected readonly codeBook = computed(() => {
    const dataSetId = this.store.cut()?.dataSet.id;
    return ['/studies', this.store.study()?.id ?? '', 'code-book', dataSetId ?? ''];
  });

  private isHere({ finding }: GuardNote): boolean {
    const { scope } = finding.place;
    return (
      finding.severity === 'refusal' ||
      scope.kind === 'pooled' ||
      (scope.kind === 'crude' && this.isAboutWhole(finding)) ||
      sameScope(scope, this.store.scope())
    );
  }

  /** In a stratified analysis the crude layer's own cells are not what is read. */
  private isAboutWhole({ guardId }: GuardFinding): boolean {
    const isCells = guardId === 'sparseCells' || guardId === 'zeroCell';
    return !isCells || this.store.scopes().length === 1;
  }
}

function noteOf({ result, style, book }: BenchPrint, finding: GuardFinding): GuardNote {
  return { finding, words: guardWords(finding, { analysisId: '', result }, style, book) };
}

function grouped(notes: readonly GuardNote[]): readonly GuardGroup[] {
  const guardIds = [...new Set(notes.map(({ finding }) => finding.guardId))];
  return guardIds.flatMap((guardId) => {
    const own = notes.filter(({ finding }) => finding.guardId === guardId);
    const [first] = own;
    return first === undefined ? [] : [groupOf(first, own)];
  });
}

function groupOf({ finding, words }: GuardNote, notes: readonly GuardNote[]): GuardGroup {
  return {
    title: words.title,
    source: words.source,
    sentences: notes.map((note) => note.words.sentence),
    tone: TONES[finding.severity],
    tag: TAGS[finding.severity],
    isAboutCodeBook: CODE_BOOK_GUARDS.includes(finding.guardId),
  };
}
