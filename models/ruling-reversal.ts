import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type Ruling } from './ruling';
import { defaulted, identifier, madeAt, reference } from './columns';

/** That a ruling was taken back. */
export class RulingReversal extends Model<InferAttributes<RulingReversal>, InferCreationAttributes<RulingReversal>> {
  declare id: CreationOptional<string>;
  declare rulingId: string;
  declare reversedBy: string;
  declare reason: CreationOptional<string>;
  declare createdAt: CreationOptional<Date>;

  declare ruling?: NonAttribute<Ruling>;
}

/** Binds the model to a connection. */
export function initRulingReversal(sequelize: Sequelize): void {
  RulingReversal.init(
    {
      id: identifier(),
      rulingId: reference(),
      reversedBy: reference(),
      reason: defaulted(DataTypes.TEXT, ''),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'RulingReversal', tableName: 'ruling_reversals', underscored: true, timestamps: false },
  );
}
