import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type Answer } from './answer';
import { type Ruling } from './ruling';
import { type User } from './user';
import { defaulted, identifier, madeAt, optionalReference, reference, required } from './columns';

export type CreditSource =
  'no-answer' | 'automatic' | 'rule' | 'ruling' | 'kin-ruling' | 'settlement' | 'appeal' | 'recheck' | 'reversal';

/** One step in the history of an answer’s credit, in thousandths of a mark. Entries form a chain and never change. */
export class CreditEntry extends Model<InferAttributes<CreditEntry>, InferCreationAttributes<CreditEntry>> {
  declare id: CreationOptional<string>;
  declare answerId: string;
  declare credit: number;
  declare outOf: number;
  declare source: CreditSource;
  declare rulingId: string | null;
  declare actorId: string | null;
  declare reason: CreationOptional<string>;
  declare previousEntryId: string | null;
  declare createdAt: CreationOptional<Date>;

  declare answer?: NonAttribute<Answer>;
  declare ruling?: NonAttribute<Ruling | null>;
  declare actor?: NonAttribute<User | null>;
}

/** Binds the model to a connection. */
export function initCreditEntry(sequelize: Sequelize): void {
  CreditEntry.init(
    {
      id: identifier(),
      answerId: reference(),
      credit: required(DataTypes.INTEGER),
      outOf: required(DataTypes.INTEGER),
      source: required(DataTypes.TEXT),
      rulingId: optionalReference(),
      actorId: optionalReference(),
      reason: defaulted(DataTypes.TEXT, ''),
      previousEntryId: optionalReference(),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'CreditEntry', tableName: 'credit_entries', underscored: true, timestamps: false },
  );
}
