import type { Node } from 'prosemirror-model';
import type { NodeView } from 'prosemirror-view';
import type { BoundValueFormat } from '#shared/report/text';
import type { AtomText, AtomWords } from './atom-words';

/** Draws the atoms of a text as chips, and again when what they print has changed. */
export class AtomViews {
  private readonly drawn = new Set<AtomView>();

  constructor(private readonly words: () => AtomWords) {}

  readonly nodeViews = {
    boundValue: (node: Node): NodeView => this.viewOf(node, valueText),
    crossReference: (node: Node): NodeView => this.viewOf(node, referenceText),
  };

  /** Draws all again: results or house style are others now. */
  refresh(): void {
    for (const view of this.drawn) view.draw();
  }

  private viewOf(node: Node, textOf: TextOfAtom): NodeView {
    const view: AtomView = new AtomView(
      node,
      (shown) => textOf(shown, this.words()),
      () => this.drawn.delete(view),
    );
    this.drawn.add(view);
    view.draw();
    return view;
  }
}

type TextOfAtom = (node: Node, words: AtomWords) => AtomText;

function valueText(node: Node, words: AtomWords): AtomText {
  return words.valueOf(node.attrs.address as string, node.attrs.format as BoundValueFormat);
}

function referenceText(node: Node, words: AtomWords): AtomText {
  return words.referenceOf(node.attrs.blockId as string);
}

class AtomView implements NodeView {
  readonly dom = document.createElement('span');

  constructor(
    private node: Node,
    private readonly textOf: (node: Node) => AtomText,
    private readonly ended: () => void,
  ) {
    this.dom.setAttribute('role', 'img');
    this.dom.contentEditable = 'false';
  }

  draw(): void {
    const { text, spoken, state } = this.textOf(this.node);
    this.dom.textContent = text;
    this.dom.setAttribute('aria-label', spoken);
    this.dom.className = `atom ${this.node.type.name} ${state}`;
  }

  update(node: Node): boolean {
    if (node.type !== this.node.type) return false;
    this.node = node;
    this.draw();
    return true;
  }

  destroy(): void {
    this.ended();
  }
}
