import { applyStep } from '#shared/report';
import { describe, expect, it } from 'vitest';
import { prose, reportOf } from '../report-store/testing/reports';
import { bindTypedNumber } from './bind-typed-number';

const ADDRESS = 'a2/risk/@all/crude/value';
const block = prose('p', 'From 3.4% to 22% in 12 months.');

function after(index: number): unknown {
  const step = bindTypedNumber(block, index, ADDRESS)!;
  const applied = applyStep(reportOf(block), step, { at: '2025-12-01T09:00:00.000Z' });
  if (!applied.ok) throw new Error(applied.issue.code);
  const content = applied.value.report.blocks[0]?.content as {
    document: { content: { content: { text?: string; type: string }[] }[] };
  };
  return content.document.content[0]?.content.map((node) => node.text ?? node.type);
}

describe('binding a typed number', () => {
  it('puts the value in its place and leaves the words around it', () => {
    expect(after(1)).toEqual(['From 3.4% to ', 'boundValue', ' in 12 months.']);
  });

  it('counts the numbers of the block', () => {
    expect(after(0)).toEqual(['From ', 'boundValue', ' to 22% in 12 months.']);
  });

  it('does nothing when the number is gone', () => {
    expect(bindTypedNumber(block, 3, ADDRESS)).toBeNull();
  });
});
