import { fieldValue, type Step } from '#shared/report';

/** The words that a step carries, so that they can be copied when it is refused; may be empty. */
export function wordsOfStep(step: Step): string {
  switch (step.kind) {
    case 'insertBlock':
      return textIn(step.block.content);
    case 'replaceContent':
      return textIn(step.content);
    case 'editText':
      return textIn(step.steps.map((each) => fieldValue(each, 'slice')));
    case 'setTitle':
      return step.title;
    case 'removeBlock':
    case 'restoreBlock':
    case 'moveBlock':
    case 'setFraming':
    case 'setHouseStyle':
    case 'movePin':
      return '';
  }
}

/** Text nodes carry their words as `text`, wherever they are. */
function textIn(value: unknown): string {
  if (typeof value !== 'object' || value === null) return '';
  const own = (value as { text?: unknown }).text;
  if (typeof own === 'string') return own;
  return Object.values(value).map(textIn).filter(Boolean).join(' ');
}
