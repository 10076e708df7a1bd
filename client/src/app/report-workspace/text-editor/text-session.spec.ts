import { documentToText, plainDocument } from '#shared/report/text';
import { afterEach, describe, expect, it } from 'vitest';
import { isFormatted } from './markdown-paste';
import { insertAtom, TEXT_COMMANDS } from './text-commands';
import { TextSession } from './text-session';

let session: TextSession;

// Nothing is laid out here; the editor asks where the cursor is when it scrolls to it.
const NOWHERE = { left: 0, right: 0, top: 0, bottom: 0 };
Object.assign(Range.prototype, {
  getClientRects: () => [NOWHERE],
  getBoundingClientRect: () => NOWHERE,
});

function edit(text: string, shape: 'one' | 'many' = 'many'): void {
  session = new TextSession({
    place: document.body,
    document: plainDocument(text),
    shape,
    name: 'Prose',
    words: () => ({
      valueOf: () => ({ text: '11.4%', spoken: '11.4%, bound to A1', state: 'bound' }),
      referenceOf: () => ({ text: 'Table 2', spoken: 'Table 2, a reference', state: 'bound' }),
    }),
    keys: {},
    moved: () => undefined,
  });
}

afterEach(() => {
  session.end();
});

/** Types as a keyboard does: rules of typing see every letter. */
function type(text: string): void {
  const { view } = session;
  for (const letter of text) {
    const { from, to } = view.state.selection;
    const taken = view.someProp('handleTextInput', (handle) =>
      handle(view, from, to, letter, () => view.state.tr.insertText(letter, from, to)),
    );
    if (taken !== true) view.dispatch(view.state.tr.insertText(letter, from, to));
  }
}

const words = (): string => documentToText(session.document);
const nodes = (): string => JSON.stringify(session.document);

describe('a text', () => {
  it('makes one step of letters typed one after the other', () => {
    edit('');
    type('Risk');
    expect([words(), session.steps.length]).toEqual(['Risk', 1]);
    session.settle();
    expect(session.steps).toEqual([]);
  });

  it('takes in what others wrote without counting it as typed here', () => {
    edit('risk rose');
    session.show(plainDocument('The risk rose'));
    expect([words(), session.steps.length]).toEqual(['The risk rose', 0]);
  });

  it('marks typed digits, as the proof does', () => {
    edit('about 22% here');
    expect(session.view.dom.querySelector('.typed')?.textContent).toBe('22%');
  });

  it('shows a value as a chip with its source', () => {
    edit('');
    session.run(insertAtom('boundValue', { address: 'a/risk/@all/crude/value', format: 'auto' }));
    expect(session.view.dom.querySelector('.atom')?.getAttribute('aria-label')).toBe(
      '11.4%, bound to A1',
    );
  });
});

describe('typed Markdown', () => {
  it('styles words between stars, and leaves a product alone', () => {
    edit('');
    type('a **clear** rise, 2*3*4');
    expect(nodes()).toContain('{"type":"text","marks":[{"type":"strong"}],"text":"clear"}');
    expect(nodes()).not.toContain('"em"');
  });

  it('begins a list, in a text of many paragraphs only', () => {
    edit('');
    type('- one');
    expect(nodes()).toContain('bulletList');
    session.end();
    edit('', 'one');
    type('- one');
    expect(nodes()).not.toContain('bulletList');
  });

  it('gives a list back by the button that made it', () => {
    edit('one');
    session.run(TEXT_COMMANDS.orderedList);
    expect(nodes()).toContain('orderedList');
    session.run(TEXT_COMMANDS.orderedList);
    expect(nodes()).not.toContain('orderedList');
  });
});

describe('pasted HTML', () => {
  it('is read as Markdown when it only colours the letters', () => {
    expect(isFormatted('<div><span style="color:red">**a**</span></div>')).toBe(false);
    expect(isFormatted('<p>a <strong>b</strong></p>')).toBe(true);
  });
});
