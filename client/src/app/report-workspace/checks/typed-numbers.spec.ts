import { describe, expect, it } from 'vitest';
import {
  type Likeness,
  likeness as likenessAmong,
  type PrintedValue,
  printedValue,
} from './typed-numbers';

function value(text: string, analysisId = text): PrintedValue {
  const scope = { kind: 'crude' } as const;
  return printedValue({ analysisId, quantity: 'risk', levelId: null, scope, facet: 'value' }, text);
}

function likeness(
  typed: string,
  values: PrintedValue[],
  printed: PrintedValue[] = [],
): Likeness | null {
  const keys = new Set(printed.map(({ key }) => key));
  return likenessAmong(typed, values, (key) => (keys.has(key) ? 'Table 2' : null));
}

describe('a typed number', () => {
  it('is like a value that rounds to it', () => {
    expect(likeness('22%', [value('21.5%')])).toMatchObject({ exact: false });
    expect(likeness('21%', [value('21.6%')])).toBeNull();
  });

  it('is like a value that says the very same', () => {
    expect(likeness('11.4%', [value('11.4%')])?.exact).toBe(true);
    expect(likeness('2,542', [value('2542')])?.exact).toBe(true);
    expect(likeness('−3.7', [value('−3.7')])?.exact).toBe(true);
  });

  it('keeps percentages and plain numbers apart', () => {
    expect(likeness('22%', [value('22')])).toBeNull();
    expect(likeness('4.5', [value('4.5%')])).toBeNull();
  });

  it('takes the value that the report prints before one that it does not', () => {
    const [other, shown] = [value('22.0%', 'a'), value('21.5%', 'b')];
    expect(likeness('22%', [other, shown], [shown])?.value.analysisId).toBe('b');
  });

  it('takes no small whole number for a result: hours and months are no findings', () => {
    expect(likeness('12', [value('12')])).toBeNull();
    expect(likeness('290', [value('290')])?.exact).toBe(true);
  });

  it('takes whole numbers only as they are', () => {
    expect(likeness('290', [value('290.4')])).toBeNull();
  });

  it('is not finer than what is printed', () => {
    expect(likeness('21.53%', [value('21.5%')])).toBeNull();
  });

  it('does not mind what it cannot read', () => {
    expect(likeness('22%', [value('P < 0.001'), value('reference')])).toBeNull();
  });
});
