import { BuilderElement, TextRun, type XmlComponent } from 'docx';
import type { TextLook } from './text-runs';

/**
 * A field with the result that it had when the document was made: readers show that result until
 * they are asked to update it.
 *
 * Source: ISO/IEC 29500-1, 17.16.18 (complex fields). The instruction must be our own text.
 */
export function fieldRuns(
  instruction: string,
  result: string,
  look: TextLook = {},
): readonly TextRun[] {
  return [
    new TextRun({ ...look, children: [fieldMark('begin')] }),
    new TextRun({ ...look, children: [instructionText(instruction)] }),
    new TextRun({ ...look, children: [fieldMark('separate')] }),
    new TextRun({ ...look, text: result }),
    new TextRun({ ...look, children: [fieldMark('end')] }),
  ];
}

function fieldMark(type: 'begin' | 'separate' | 'end'): XmlComponent {
  return new BuilderElement({
    name: 'w:fldChar',
    attributes: { type: { key: 'w:fldCharType', value: type } },
  });
}

function instructionText(instruction: string): XmlComponent {
  return new BuilderElement({
    name: 'w:instrText',
    attributes: { space: { key: 'xml:space', value: 'preserve' } },
    // A text node of the element; its type names components only.
    children: [` ${instruction} ` as unknown as XmlComponent],
  });
}
