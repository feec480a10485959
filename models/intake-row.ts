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
import { type Intake } from './intake';
import { type ProblemSetItem } from './problem-set-item';
import { type User } from './user';
import { defaulted, identifier, optional, optionalReference, reference, required } from './columns';

export type IntakeRowState = 'accepted' | 'refused';

/** One answer read from an uploaded file; `cell` tells answers of one line apart where a row holds a student’s whole sheet. */
export class IntakeRow extends Model<InferAttributes<IntakeRow>, InferCreationAttributes<IntakeRow>> {
  declare id: CreationOptional<string>;
  declare intakeId: string;
  declare line: number;
  declare cell: CreationOptional<number>;
  declare fields: Record<string, string> | string[];
  declare state: IntakeRowState;
  declare reasonCode: string | null;
  declare message: string | null;
  declare userId: string | null;
  declare itemId: string | null;
  declare partKey: string | null;
  declare text: string | null;
  declare answerId: string | null;

  declare intake?: NonAttribute<Intake>;
  declare user?: NonAttribute<User | null>;
  declare item?: NonAttribute<ProblemSetItem | null>;
  declare answer?: NonAttribute<Answer | null>;
}

/** Binds the model to a connection. */
export function initIntakeRow(sequelize: Sequelize): void {
  IntakeRow.init(
    {
      id: identifier(),
      intakeId: reference(),
      line: required(DataTypes.INTEGER),
      cell: defaulted(DataTypes.INTEGER, 0),
      fields: required(DataTypes.JSONB),
      state: required(DataTypes.TEXT),
      reasonCode: optional(DataTypes.TEXT),
      message: optional(DataTypes.TEXT),
      userId: optionalReference(),
      itemId: optionalReference(),
      partKey: optional(DataTypes.TEXT),
      text: optional(DataTypes.TEXT),
      answerId: optionalReference(),
    },
    { sequelize, modelName: 'IntakeRow', tableName: 'intake_rows', underscored: true, timestamps: false },
  );
}
