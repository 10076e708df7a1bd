import type { Guard } from './guard';
import { WHOLE } from './places';

/** Nobody or everybody has the event: no effect, no test. Facts: events, total. */
export const allOrNoEvents = {
  id: 'allOrNoEvents',
  severity: 'refusal',
  source: 'With an empty outcome margin no measure of association is defined.',
  find({ crude }) {
    const { events, total } = crude.total;
    const same = total > 0 && (events === 0 || events === total);
    return same ? [{ place: WHOLE, facts: { events, total } }] : [];
  },
} as const satisfies Guard<'allOrNoEvents'>;
