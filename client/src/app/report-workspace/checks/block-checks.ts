import type { LayoutElement } from '#shared/layout';
import { counted } from '../../ui/words';
import type { PrintedBlock } from '../proof/printed-block';
import type { ProofCheck } from './proof-check';
import { type Likeness, likeness, type PrintedValue } from './typed-numbers';

/** What the checks of a block may ask: names of analyses, and every value that could be meant. */
export interface CheckContext {
  readonly nameOf: (analysisId: string) => string;
  readonly values: () => readonly PrintedValue[];
  /** The table or figure that prints a value, as in "Table 2"; null when none does. */
  readonly placeOf: (key: string) => string | null;
}

/** What is wrong in a block: lost sources, typed numbers, what cannot be printed. */
export function blockChecks(
  blockId: string,
  printed: PrintedBlock,
  context: CheckContext,
): readonly ProofCheck[] {
  return [
    ...printed.elements.flatMap((element) => unprintable(blockId, element)),
    ...lostSources(blockId, printed),
    ...typedNumbers(blockId, printed, context),
  ];
}

function unprintable(blockId: string, element: LayoutElement): readonly ProofCheck[] {
  if (element.kind !== 'problem') return [];
  return [
    {
      id: `${blockId}/unprintable`,
      blockId,
      weight: 'problem',
      tag: 'Block',
      subject: 'Nothing to print yet',
      text: element.message,
      anchor: { selector: '.problem', index: 0 },
      remedies: [{ kind: 'edit', label: 'Open the block' }],
    },
  ];
}

function lostSources(blockId: string, { missing }: PrintedBlock): readonly ProofCheck[] {
  if (missing === 0) return [];
  return [
    {
      id: `${blockId}/lost`,
      blockId,
      weight: 'problem',
      tag: 'Source',
      subject: `${counted(missing, 'value has', 'values have')} lost their source`,
      text: 'The analysis, level or stratum behind it is no longer there. Choose another value.',
      anchor: { selector: '.missing', index: 0 },
      remedies: [{ kind: 'edit', label: 'Open the block' }],
    },
  ];
}

function typedNumbers(
  blockId: string,
  { typed }: PrintedBlock,
  context: CheckContext,
): readonly ProofCheck[] {
  if (typed.length === 0) return [];
  const alike = typed.map((text) => likeness(text, context.values(), context.placeOf));
  const told = typed.flatMap((text, index) => {
    const found = alike[index];
    return found ? [typedResult(blockId, { text, index }, found, context)] : [];
  });
  const rest = typed.filter((_, index) => !alike[index]);
  return rest.length === 0 ? told : [...told, otherNumbers(blockId, rest, typed)];
}

function typedResult(
  blockId: string,
  { text, index }: { readonly text: string; readonly index: number },
  found: Likeness,
  context: CheckContext,
): ProofCheck {
  const name = context.nameOf(found.value.analysisId);
  const place = found.printedIn === null ? '' : `, as ${found.printedIn} prints`;
  const says = found.exact ? 'has the same number' : `says ${found.value.text}`;
  return {
    id: `${blockId}/typed/${text}/${index}`,
    blockId,
    weight: 'problem',
    tag: 'Number',
    subject: 'Typed, not bound',
    text: `“${text}” was typed. ${name} ${says}${place}.`,
    anchor: { selector: '.typed', index },
    remedies: [
      { kind: 'bind', label: `Bind to ${name}`, typedIndex: index, address: found.value.key },
    ],
  };
}

/** Numbers that are no result of a pinned analysis: said, but nothing is asked. */
function otherNumbers(
  blockId: string,
  rest: readonly string[],
  typed: readonly string[],
): ProofCheck {
  return {
    id: `${blockId}/typed`,
    blockId,
    weight: 'quiet',
    tag: '',
    subject: '',
    text: `${counted(rest.length, 'number', 'numbers')} typed, not bound: ${[...new Set(rest)].join(', ')}`,
    anchor: { selector: '.typed', index: typed.indexOf(rest[0] ?? '') },
    remedies: [],
  };
}
