/** One paragraph only, or any number of paragraphs and lists. */
export type TextShape = 'one' | 'many';
