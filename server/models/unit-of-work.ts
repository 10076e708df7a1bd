import { AsyncLocalStorage } from 'node:async_hooks';
import { Transaction, type Sequelize } from 'sequelize';
import type { WriteQueue } from './write-queue';

/** What a write is about; several servers could later lock by it. SQLite has one queue for all. */
export type WriteScope = 'site' | `study:${string}` | `report:${string}`;

/** One open transaction; every writing function of a store asks for it. */
export interface Unit {
  readonly transaction: Transaction;
}

/**
 * Runs work as one transaction, alone. Reads inside it pass the unit too, to see its own writes.
 *
 * All of it is stored or nothing: work that throws, or that gives a failure (`{ ok: false }`),
 * leaves no trace. Opening a unit within a unit would wait for itself for ever, so it is refused.
 */
export type UnitOfWork = <Value>(
  scope: WriteScope,
  work: (unit: Unit) => Promise<Value>,
) => Promise<Value>;

/** Binds units of work to a database and its queue. */
export function createUnitOfWork(sequelize: Sequelize, queue: WriteQueue): UnitOfWork {
  const open = new AsyncLocalStorage<WriteScope>();
  return (scope, work) => {
    refuseNesting(scope, open.getStore());
    return queue.run(() => open.run(scope, () => inTransaction(sequelize, work)));
  };
}

function refuseNesting(scope: WriteScope, outer: WriteScope | undefined): void {
  if (outer === undefined) return;
  throw new Error(`A unit of work (${scope}) was opened within another (${outer}).`);
}

class RolledBack<Value> extends Error {
  constructor(readonly value: Value) {
    super('rolled back');
  }
}

async function inTransaction<Value>(
  sequelize: Sequelize,
  work: (unit: Unit) => Promise<Value>,
): Promise<Value> {
  try {
    return await sequelize.transaction(
      { type: Transaction.TYPES.IMMEDIATE },
      async (transaction) => {
        const value = await work({ transaction });
        if (isFailure(value)) throw new RolledBack(value);
        return value;
      },
    );
  } catch (problem) {
    if (problem instanceof RolledBack) return problem.value as Value;
    throw problem;
  }
}

function isFailure(value: unknown): boolean {
  return typeof value === 'object' && value !== null && 'ok' in value && value.ok === false;
}
