import { computeAnalysis, frameOf } from '#shared/analysis';
import { expect, it } from 'vitest';
import { inputsOf, TEST_OUTCOME } from '../../shared/analysis/testing/counts-analysis';
import { compute, type Computation } from './compute-off-thread';

function computation(riskDifference: string): Computation {
  const methods = { risk: 'wilson', riskDifference, riskRatio: 'katz', oddsRatio: 'woolf' };
  const { codeBook, specification, study, tally } = inputsOf({
    levels: ['no', 'yes'],
    counts: [
      [3, 10],
      [9, 10],
    ],
    specification: { methods },
  });
  const frame = frameOf(codeBook, specification, TEST_OUTCOME, study);
  if (!frame.ok) throw new Error(frame.issue.code);
  return { specification, frame: frame.value, tally };
}

it.each(['newcombe', 'chanZhang'])('gives the same result for %s as in this thread', async (id) => {
  const { specification, frame, tally } = computation(id);
  const result = await compute({ specification, frame, tally });
  expect(result).toEqual(computeAnalysis(specification, frame, tally));
  expect(result.ok && result.value.crude.contrasts[0]?.measures.riskDifference).toMatchObject({
    ok: true,
    value: { value: 0.6, interval: { method: id } },
  });
});
