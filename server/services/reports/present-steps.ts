import type { AcceptedStep } from '#shared/api';
import type { Dependencies } from '../../dependencies';
import type { StoredStep } from '../../models/step/step-store';
import type { Unit } from '../../models/unit-of-work';

/** Steps with the names of who made them, in their order. */
export async function presentSteps(
  { database }: Dependencies,
  steps: readonly StoredStep[],
  unit?: Unit,
): Promise<AcceptedStep[]> {
  const ids = [...new Set(steps.map(({ personId }) => personId))];
  const people = await database.stores.users.findMany(ids, unit);
  const names = new Map(people.map(({ id, name }) => [id, name]));
  return steps
    .toSorted((one, other) => one.seq - other.seq)
    .map((step) => presentStep(step, names.get(step.personId) ?? ''));
}

function presentStep(
  { id, groupId, undoes, seq, personId, at, forward, inverse }: StoredStep,
  person: string,
): AcceptedStep {
  const step = { ...forward };
  return { id, groupId, undoes, step, inverse: { ...inverse }, seq, person, personId, at };
}
