/**
 * The numbers in a text, in order, as they are printed: "+14.2", "-1.8", "1,198". A minus is one
 * when nothing stands before it that it could join.
 */
export function numbersIn(text: string): readonly string[] {
  const plain = text.replaceAll('\u2212', '-').replaceAll('·', '.');
  return plain.match(/(?:(?<![\w)])[+-])?\d+(?:,\d{3})*(?:\.\d+)?/g) ?? [];
}
