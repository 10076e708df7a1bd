import { expect, it } from 'vitest';
import { sniffDelimiter } from './sniff-delimiter';

it.each([
  [',', 'a,b,c\n1,2,3\n'],
  [';', 'a;b;c\r\n1,5;2,5;3\r\n1,25;2;3,5\r\n'],
  ['\t', 'a\tb\n1, 2\t3\n'],
  ['|', 'a|b|c\rx;y|2|3\r'],
  [',', '"a;b;c",d\n"1;2;3",4\n"1;2",5\n'],
  [',', 'just one column\nof text\n'],
  [',', ''],
  [';', 'name;age'],
  [',', 'a,b\n"line\nbreak",2\n3,4\n'],
])('finds %j', (delimiter, text) => {
  expect(sniffDelimiter(text)).toBe(delimiter);
});
