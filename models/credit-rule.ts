import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type ProblemSetItem } from './problem-set-item';
import { identifier, madeAt, optional, optionalReference, reference, required } from './columns';

/** A set’s own rule: what a slip earns in a part, in thousandths of a mark. */
export class CreditRule extends Model<InferAttributes<CreditRule>, InferCreationAttributes<CreditRule>> {
  declare id: CreationOptional<string>;
  declare problemSetId: string;
  declare itemId: string;
  declare partKey: string;
  declare slip: string;
  declare credit: number;
  declare fromRulingId: string | null;
  declare createdBy: string;
  declare createdAt: CreationOptional<Date>;
  declare retiredAt: Date | null;

  declare item?: NonAttribute<ProblemSetItem>;
}

/** Binds the model to a connection. */
export function initCreditRule(sequelize: Sequelize): void {
  CreditRule.init(
    {
      id: identifier(),
      problemSetId: reference(),
      itemId: reference(),
      partKey: required(DataTypes.TEXT),
      slip: required(DataTypes.TEXT),
      credit: required(DataTypes.INTEGER),
      fromRulingId: optionalReference(),
      createdBy: reference(),
      createdAt: madeAt(),
      retiredAt: optional(DataTypes.DATE),
    },
    { sequelize, modelName: 'CreditRule', tableName: 'credit_rules', underscored: true, timestamps: false },
  );
}
