import { DataTypes, type Model, type ModelStatic, type Transaction } from 'sequelize';
import type { Unit } from './unit-of-work';

/** The option that makes a query part of a unit, or of none. */
export function within(unit: Unit | undefined): { readonly transaction: Transaction | null } {
  return { transaction: unit?.transaction ?? null };
}

/** The plain row of a model instance; flags are stored as 0 and 1. */
export function plain<Row extends object>(instance: Model<Row>): Row {
  const row = instance.get({ plain: true }) as Record<string, unknown>;
  for (const name of flagsOf(instance.constructor as ModelStatic<Model>)) {
    row[name] = Boolean(row[name]);
  }
  return row as Row;
}

/** The plain row, or null for none. */
export function plainOrNull<Row extends object>(instance: Model<Row> | null): Row | null {
  return instance === null ? null : plain(instance);
}

const FLAGS = new WeakMap<ModelStatic<Model>, readonly string[]>();

function flagsOf(model: ModelStatic<Model>): readonly string[] {
  const known = FLAGS.get(model);
  if (known !== undefined) return known;
  const flags = Object.entries(model.getAttributes())
    .filter(([, { type }]) => type instanceof DataTypes.BOOLEAN)
    .map(([name]) => name);
  FLAGS.set(model, flags);
  return flags;
}
