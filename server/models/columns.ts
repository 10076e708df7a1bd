import { DataTypes, type DataType } from 'sequelize';

/** A column of a model; a fresh object each time, because Sequelize writes into it. */
export interface Column {
  readonly type: DataType;
  readonly allowNull: boolean;
  readonly primaryKey?: true;
}

/** Part of the primary key: an id, or a whole number where `type` says so. */
export function key(type: DataType = DataTypes.TEXT): Column {
  return { type, allowNull: false, primaryKey: true };
}

/** Text; also a time (ISO 8601, UTC) and JSON, which the stores write and parse. */
export function text(): Column {
  return { type: DataTypes.TEXT, allowNull: false };
}

/** Text or null. */
export function optionalText(): Column {
  return { type: DataTypes.TEXT, allowNull: true };
}

/** A whole number. */
export function whole(): Column {
  return { type: DataTypes.INTEGER, allowNull: false };
}

/** A whole number or null. */
export function optionalWhole(): Column {
  return { type: DataTypes.INTEGER, allowNull: true };
}

/** A finite number. */
export function real(): Column {
  return { type: DataTypes.DOUBLE, allowNull: false };
}

/** Yes or no. */
export function flag(): Column {
  return { type: DataTypes.BOOLEAN, allowNull: false };
}

/** Bytes. */
export function bytes(): Column {
  return { type: DataTypes.BLOB, allowNull: false };
}
