import { history } from 'prosemirror-history';
import {
  type Command,
  EditorState,
  NodeSelection,
  Selection,
  type Transaction,
} from 'prosemirror-state';
import type { Step } from 'prosemirror-transform';
import { EditorView } from 'prosemirror-view';
import { documentOfNode, nodeOfDocument } from '#shared/report/text/parse-text-document';
import type { TextDocument } from '#shared/report/text';
import { AtomViews } from './atom-view';
import type { AtomWords } from './atom-words';
import { markdownPaste } from './markdown-paste';
import { markdownTyping } from './markdown-typing';
import { textKeys } from './text-keys';
import type { TextShape } from './text-shape';
import { typedNumerals } from './typed-numerals';

/** What a text is edited with. */
export interface TextSessionOptions {
  readonly place: HTMLElement;
  readonly document: TextDocument;
  readonly shape: TextShape;
  readonly name: string;
  readonly words: () => AtomWords;
  readonly keys: Readonly<Record<string, Command>>;
  /** Called after every change of text or selection. */
  readonly moved: (change: 'text' | 'selection') => void;
}

const FROM_OUTSIDE = 'fromOutside';

/**
 * A text while it is edited: the editor, and the steps made since they were last taken. Texts that
 * others changed meanwhile are put in without losing the place of the cursor.
 */
export class TextSession {
  readonly view: EditorView;
  private readonly atoms: AtomViews;
  private made: readonly Step[] = [];

  constructor(private readonly options: TextSessionOptions) {
    this.atoms = new AtomViews(options.words);
    this.view = new EditorView(options.place, {
      state: stateOf(options),
      nodeViews: this.atoms.nodeViews,
      dispatchTransaction: (transaction) => {
        this.apply(transaction);
      },
      attributes: {
        role: 'textbox',
        'aria-label': options.name,
        'aria-multiline': String(options.shape === 'many'),
        class: 'text',
      },
    });
  }

  get document(): TextDocument {
    return documentOfNode(this.view.state.doc);
  }

  /** The steps since the last `settle`, as JSON. */
  get steps(): readonly unknown[] {
    return this.made.map((step) => step.toJSON() as unknown);
  }

  /** Forgets the steps: they are part of the report now. */
  settle(): void {
    this.made = [];
  }

  run(command: Command): boolean {
    const done = command(this.view.state, this.view.dispatch.bind(this.view), this.view);
    this.view.focus();
    return done;
  }

  /** Puts in what the text is elsewhere, as a change that nobody here has made. */
  show(document: TextDocument): void {
    const now = this.view.state.doc;
    const then = nodeOfDocument(document);
    const start = now.content.findDiffStart(then.content);
    const end = now.content.findDiffEnd(then.content);
    if (start === null || end === null) return;
    const overlap = Math.max(0, start - Math.min(end.a, end.b));
    const slice = then.slice(start, end.b + overlap);
    const transaction = this.view.state.tr.replace(start, end.a + overlap, slice);
    this.view.dispatch(transaction.setMeta(FROM_OUTSIDE, true).setMeta('addToHistory', false));
  }

  refreshAtoms(): void {
    this.atoms.refresh();
  }

  focusEnd(): void {
    const { state } = this.view;
    this.view.dispatch(state.tr.setSelection(Selection.atEnd(state.doc)).scrollIntoView());
    this.view.focus();
  }

  /** The atom that is selected as a whole, if one is. */
  get selectedAtom(): {
    readonly type: string;
    readonly attrs: Readonly<Record<string, unknown>>;
  } | null {
    const { selection } = this.view.state;
    if (!(selection instanceof NodeSelection) || !selection.node.isAtom) return null;
    return { type: selection.node.type.name, attrs: selection.node.attrs };
  }

  end(): void {
    this.view.destroy();
  }

  private apply(transaction: Transaction): void {
    this.view.updateState(this.view.state.apply(transaction));
    const own = transaction.docChanged && transaction.getMeta(FROM_OUTSIDE) !== true;
    if (own) this.made = transaction.steps.reduce(withStep, this.made);
    this.options.moved(own ? 'text' : 'selection');
  }
}

function stateOf({ document, shape, keys }: TextSessionOptions): EditorState {
  return EditorState.create({
    doc: nodeOfDocument(document),
    plugins: [
      ...textKeys(shape, keys),
      history(),
      markdownTyping(shape),
      markdownPaste(shape),
      typedNumerals(),
    ],
  });
}

/** Letters typed one after the other become one step. */
function withStep(steps: readonly Step[], step: Step): readonly Step[] {
  const merged = steps.at(-1)?.merge(step) ?? null;
  return merged === null ? [...steps, step] : [...steps.slice(0, -1), merged];
}
