import { SaxesParser, type SaxesTagPlain } from 'saxes';
import { damaged, ReadingStopped } from './reading-stopped';

/** What a part of a workbook is told, element by element; names come without prefix. */
export interface XmlEvents {
  readonly open?: (name: string, attributes: Readonly<Record<string, string>>) => void;
  readonly text?: (text: string) => void;
  readonly close?: (name: string) => void;
  /** Called between chunks; the parsing waits for it. */
  readonly pause?: () => Promise<void>;
}

/**
 * Parses a part of a workbook as it is unpacked; stops with `damagedWorkbook` where it is no XML.
 *
 * A document type is refused, so that no entity can be declared; nothing outside is ever fetched.
 */
export async function parseXml(
  part: string,
  chunks: AsyncIterable<Buffer>,
  events: XmlEvents,
): Promise<void> {
  const parser = createParser(part, events);
  const decoder = new TextDecoder('utf-8', { fatal: true });
  try {
    for await (const chunk of chunks) {
      parser.write(decoder.decode(chunk, { stream: true }));
      await events.pause?.();
    }
    parser.write(decoder.decode()).close();
  } catch (problem) {
    throw problem instanceof ReadingStopped ? problem : damaged(`the part "${part}"`);
  }
}

function createParser(part: string, { open, text, close }: XmlEvents): SaxesParser {
  const parser = new SaxesParser();
  parser.on('doctype', () => {
    throw damaged(`the part "${part}"`);
  });
  parser.on('error', (problem) => {
    throw problem;
  });
  if (open !== undefined) {
    parser.on('opentag', (tag: SaxesTagPlain) => {
      open(localName(tag.name), tag.attributes);
    });
  }
  if (close !== undefined) {
    parser.on('closetag', (tag: SaxesTagPlain) => {
      close(localName(tag.name));
    });
  }
  if (text !== undefined) {
    parser.on('text', text);
    parser.on('cdata', text);
  }
  return parser;
}

function localName(name: string): string {
  const colon = name.indexOf(':');
  return colon < 0 ? name : name.slice(colon + 1);
}

/** The value of an attribute, with or without a prefix before its name; '' without. */
export function attributeOf(attributes: Readonly<Record<string, string>>, name: string): string {
  const direct = attributes[name];
  if (direct !== undefined) return direct;
  const prefixed = Object.keys(attributes).find((key) => key.endsWith(`:${name}`));
  return prefixed === undefined ? '' : (attributes[prefixed] ?? '');
}
