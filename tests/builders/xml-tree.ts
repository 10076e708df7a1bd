import { SaxesParser } from 'saxes';

/** An element of an XML document. */
export interface XmlElement {
  readonly name: string;
  readonly attributes: Readonly<Record<string, string>>;
  readonly children: readonly (XmlElement | string)[];
}

/** Reads a document; one that is not well-formed is an error. */
export function parseXml(xml: string): XmlElement {
  const root: OpenElement = { name: '', attributes: {}, children: [] };
  const open = [root];
  const parser = new SaxesParser();
  parser.on('error', (problem) => {
    throw problem;
  });
  parser.on('opentag', ({ name, attributes }) => {
    const element: OpenElement = { name, attributes, children: [] };
    open.at(-1)!.children.push(element);
    open.push(element);
  });
  parser.on('closetag', () => void open.pop());
  parser.on('text', (text) => void open.at(-1)!.children.push(text));
  parser.write(xml).close();
  return root.children.find((child): child is OpenElement => typeof child !== 'string')!;
}

/** All elements of a name, in the order of the document. */
export function elementsNamed(element: XmlElement, name: string): readonly XmlElement[] {
  return element.children.flatMap((child) => {
    if (typeof child === 'string') return [];
    const inside = elementsNamed(child, name);
    return child.name === name ? [child, ...inside] : inside;
  });
}

/** The text inside an element, with everything below it. */
export function textIn(element: XmlElement): string {
  return element.children
    .map((child) => (typeof child === 'string' ? child : textIn(child)))
    .join('');
}

interface OpenElement extends XmlElement {
  readonly children: (XmlElement | string)[];
}
