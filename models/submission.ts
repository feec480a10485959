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
import { type Draw } from './draw';
import { type Intake } from './intake';
import { type User } from './user';
import { defaulted, identifier, madeAt, optional, optionalReference, reference, required } from './columns';

export type SubmissionSource = 'typed' | 'intake';

/** One handing-in for one draw, typed or by intake; `clientKey` makes a repeated request the same submission. */
export class Submission extends Model<InferAttributes<Submission>, InferCreationAttributes<Submission>> {
  declare id: CreationOptional<string>;
  declare drawId: string;
  declare userId: string;
  declare source: SubmissionSource;
  declare submittedAt: Date;
  declare receipt: string;
  declare clientKey: string | null;
  declare intakeId: string | null;
  declare late: CreationOptional<boolean>;
  declare createdAt: CreationOptional<Date>;

  declare draw?: NonAttribute<Draw>;
  declare user?: NonAttribute<User>;
  declare intake?: NonAttribute<Intake | null>;
  declare answers?: NonAttribute<Answer[]>;
}

/** Binds the model to a connection. */
export function initSubmission(sequelize: Sequelize): void {
  Submission.init(
    {
      id: identifier(),
      drawId: reference(),
      userId: reference(),
      source: required(DataTypes.TEXT),
      submittedAt: required(DataTypes.DATE),
      receipt: required(DataTypes.TEXT),
      clientKey: optional(DataTypes.TEXT),
      intakeId: optionalReference(),
      late: defaulted(DataTypes.BOOLEAN, false),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'Submission', tableName: 'submissions', underscored: true, timestamps: false },
  );
}
