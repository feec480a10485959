import { DataTypes, type DataType } from 'sequelize';

/**
 * The attribute definitions that the models are written in. Each call makes a fresh object, since Sequelize writes into
 * what it is given. What a column may hold is said once, by the
 * CHECK constraints of its table.
 */

/** The uuid primary key, made here so that a row's id is known before it is written. */
export function identifier() {
  return { type: DataTypes.UUID, primaryKey: true, allowNull: false, defaultValue: DataTypes.UUIDV4 };
}

/** A column that must be given. */
export function required(type: DataType) {
  return { type, allowNull: false };
}

/** A column that may be null. */
export function optional(type: DataType) {
  return { type, allowNull: true };
}

/** A column that is never null and has a value when none is given. */
export function defaulted(type: DataType, defaultValue: unknown) {
  return { type, allowNull: false, defaultValue };
}

/** The instant at which a row was made, where the caller does not say. */
export function madeAt() {
  return { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW };
}

/** A foreign key to a row that is always there. */
export function reference() {
  return { type: DataTypes.UUID, allowNull: false };
}

/** A foreign key that may be empty. */
export function optionalReference() {
  return { type: DataTypes.UUID, allowNull: true };
}

/** A list of words. */
export function wordList(defaultValue?: string[]) {
  const type = DataTypes.ARRAY(DataTypes.TEXT);
  return defaultValue === undefined ? required(type) : defaulted(type, defaultValue);
}
