import { Step as TextStep } from 'prosemirror-transform';
import type { Node } from 'prosemirror-model';
import { failure, success } from '#shared/core';
import type { Result } from '#shared/core';
import { blockKindOf, parseContent } from '../blocks/block-kinds';
import type { Block } from '../report';
import { documentOfNode, nodeOfDocument } from '../text/parse-text-document';
import { textSchema } from '../text/schema';
import type { StepIssue } from './step';

/** A content after text steps, and the text steps that take them back. */
export interface EditedText {
  readonly content: unknown;
  readonly inverse: readonly unknown[];
}

/**
 * Applies ProseMirror steps (their JSON) to the editable text of a block.
 *
 * Gives the issues `textNotEditable`, `textStepFailed` (a step that can't be read or doesn't fit
 * the text) and those of the resulting content.
 */
export function editBlockText(
  block: Block,
  steps: readonly unknown[],
): Result<EditedText, StepIssue> {
  const kind = blockKindOf(block.kind);
  if (!kind.ok) return kind;
  const editable = kind.value.editableText;
  if (editable === null) return failure({ code: 'textNotEditable', facts: { blockId: block.id } });
  const edited = applyTextSteps(nodeOfDocument(editable.documentOf(block.content)), steps);
  if (edited === null) return failure({ code: 'textStepFailed', facts: { blockId: block.id } });
  const content = parseContent(
    block.kind,
    editable.withDocument(block.content, documentOfNode(edited.node)),
  );
  return content.ok ? success({ content: content.value, inverse: edited.inverse }) : content;
}

/** Reads the JSON of a text step; null where it can't be read. */
export function readTextStep(json: unknown): TextStep | null {
  try {
    return TextStep.fromJSON(textSchema, json);
  } catch (error) {
    // ProseMirror reports unreadable JSON by throwing RangeError, or TypeError for a wrong shape.
    if (error instanceof RangeError || error instanceof TypeError) return null;
    throw error;
  }
}

interface EditedNode {
  readonly node: Node;
  readonly inverse: readonly unknown[];
}

function applyTextSteps(start: Node, steps: readonly unknown[]): EditedNode | null {
  const inverse: unknown[] = [];
  let node = start;
  for (const json of steps) {
    const applied = applyTextStep(node, json);
    if (applied === null) return null;
    inverse.unshift(applied.inverse);
    node = applied.node;
  }
  return { node, inverse };
}

function applyTextStep(node: Node, json: unknown): { node: Node; inverse: unknown } | null {
  const step = readTextStep(json);
  if (step === null) return null;
  try {
    const after = step.apply(node).doc;
    if (after === null) return null;
    after.check();
    return { node: after, inverse: step.invert(node).toJSON() };
  } catch (error) {
    // Positions outside the document throw RangeError rather than failing as a result.
    if (error instanceof RangeError) return null;
    throw error;
  }
}
