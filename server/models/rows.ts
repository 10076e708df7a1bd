import type { Model, Transaction } from 'sequelize';
import type { Unit } from './unit-of-work';

/** The option that makes a query part of a unit, or of none. */
export function within(unit: Unit | undefined): { readonly transaction: Transaction | null } {
  return { transaction: unit?.transaction ?? null };
}

/** The plain row of a model instance. */
export function plain<Row extends object>(instance: Model<Row>): Row {
  return instance.get({ plain: true });
}

/** The plain row, or null for none. */
export function plainOrNull<Row extends object>(instance: Model<Row> | null): Row | null {
  return instance === null ? null : plain(instance);
}
