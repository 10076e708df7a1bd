import { Fragment, type Node, Slice } from 'prosemirror-model';
import { ReplaceStep } from 'prosemirror-transform';
import { type Block, blockKindOf, type Step } from '#shared/report';
import { splitNumerals } from '#shared/report/text/numerals';
import { nodeOfDocument } from '#shared/report/text/parse-text-document';
import { textSchema } from '#shared/report/text/schema';

/**
 * The step that puts a bound value in the place of the nth number typed into a block's text; null
 * when the block has no such number any more.
 */
export function bindTypedNumber(block: Block, typedIndex: number, address: string): Step | null {
  const kind = blockKindOf(block.kind);
  if (!kind.ok || kind.value.editableText === null) return null;
  const node = nodeOfDocument(kind.value.editableText.documentOf(block.content));
  const place = typedPlaces(node)[typedIndex];
  if (place === undefined) return null;
  const value = textSchema.nodes.boundValue.create({ address, format: 'auto' }, null, place.marks);
  const step = new ReplaceStep(place.from, place.to, new Slice(Fragment.from(value), 0, 0));
  const steps = [step.toJSON() as unknown];
  return { kind: 'editText', blockId: block.id, baseVersion: block.version, steps };
}

interface TypedPlace {
  readonly from: number;
  readonly to: number;
  readonly marks: Node['marks'];
}

function typedPlaces(document: Node): readonly TypedPlace[] {
  const places: TypedPlace[] = [];
  document.descendants((node, position) => {
    let from = position;
    for (const part of splitNumerals(node.text ?? '')) {
      const to = from + part.text.length;
      if (part.numeral) places.push({ from, to, marks: node.marks });
      from = to;
    }
  });
  return places;
}
