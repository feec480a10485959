import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type IntakeRow } from './intake-row';
import { type ProblemSet } from './problem-set';
import { type StoredFile } from './stored-file';
import { type User } from './user';
import { defaulted, identifier, madeAt, optional, reference, required } from './columns';

export type IntakeState =
  'uploaded' | 'reading' | 'previewed' | 'committing' | 'checking' | 'done' | 'cancelled' | 'failed';

/** One bulk upload, from file to outcome sheet. */
export class Intake extends Model<InferAttributes<Intake>, InferCreationAttributes<Intake>> {
  declare id: CreationOptional<string>;
  declare courseId: string;
  declare problemSetId: string;
  declare uploadedBy: string;
  declare storedFileId: string;
  declare contentHash: string;
  declare state: CreationOptional<IntakeState>;
  declare encoding: string | null;
  declare mapping: Record<string, unknown> | null;
  declare rowsTotal: CreationOptional<number>;
  declare rowsAccepted: CreationOptional<number>;
  declare rowsRefused: CreationOptional<number>;
  declare rowsCommitted: CreationOptional<number>;
  declare rowsChecked: CreationOptional<number>;
  declare failure: string | null;
  declare committedAt: Date | null;
  declare finishedAt: Date | null;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  declare problemSet?: NonAttribute<ProblemSet>;
  declare storedFile?: NonAttribute<StoredFile>;
  declare uploader?: NonAttribute<User>;
  declare rows?: NonAttribute<IntakeRow[]>;
}

/** Binds the model to a connection. */
export function initIntake(sequelize: Sequelize): void {
  Intake.init(
    {
      id: identifier(),
      courseId: reference(),
      problemSetId: reference(),
      uploadedBy: reference(),
      storedFileId: reference(),
      contentHash: required(DataTypes.TEXT),
      state: defaulted(DataTypes.TEXT, 'uploaded'),
      encoding: optional(DataTypes.TEXT),
      mapping: optional(DataTypes.JSONB),
      rowsTotal: defaulted(DataTypes.INTEGER, 0),
      rowsAccepted: defaulted(DataTypes.INTEGER, 0),
      rowsRefused: defaulted(DataTypes.INTEGER, 0),
      rowsCommitted: defaulted(DataTypes.INTEGER, 0),
      rowsChecked: defaulted(DataTypes.INTEGER, 0),
      failure: optional(DataTypes.TEXT),
      committedAt: optional(DataTypes.DATE),
      finishedAt: optional(DataTypes.DATE),
      createdAt: madeAt(),
      updatedAt: madeAt(),
    },
    {
      sequelize,
      modelName: 'Intake',
      tableName: 'intakes',
      underscored: true,
      timestamps: true,
      createdAt: false,
      updatedAt: 'updatedAt',
    },
  );
}
