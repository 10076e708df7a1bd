import { issueOfGroup } from '../../check-counts';
import type { GroupCount } from '../../fourfold-table';
import { intervalMethod } from '../interval-method';
import type { IntervalMethod, IntervalMethodParts } from '../interval-method';

/** An interval method for the risk of one group; limits in [0, 1]. */
export function riskMethod<Id extends string>(
  parts: IntervalMethodParts<GroupCount, Id>,
): IntervalMethod<GroupCount> & { readonly id: Id } {
  return intervalMethod((count) => issueOfGroup(count, 'group'), parts);
}
