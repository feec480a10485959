import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type ProblemSet } from './problem-set';
import { type User } from './user';
import { identifier, reference, required } from './columns';

/** That a student’s scores of a set are out. */
export class SetRelease extends Model<InferAttributes<SetRelease>, InferCreationAttributes<SetRelease>> {
  declare id: CreationOptional<string>;
  declare problemSetId: string;
  declare userId: string;
  declare releasedAt: Date;
  declare releasedBy: string;

  declare problemSet?: NonAttribute<ProblemSet>;
  declare user?: NonAttribute<User>;
}

/** Binds the model to a connection. */
export function initSetRelease(sequelize: Sequelize): void {
  SetRelease.init(
    {
      id: identifier(),
      problemSetId: reference(),
      userId: reference(),
      releasedAt: required(DataTypes.DATE),
      releasedBy: reference(),
    },
    { sequelize, modelName: 'SetRelease', tableName: 'set_releases', underscored: true, timestamps: false },
  );
}
