import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type Delivery } from './delivery';
import { type ProblemSet } from './problem-set';
import { type User } from './user';
import { identifier, madeAt, reference, required } from './columns';

/** What a student is told of their marks; a correction is the next revision. */
export class ScoreReport extends Model<InferAttributes<ScoreReport>, InferCreationAttributes<ScoreReport>> {
  declare id: CreationOptional<string>;
  declare problemSetId: string;
  declare userId: string;
  declare revision: number;
  declare content: Record<string, unknown>;
  declare reason: string;
  declare createdAt: CreationOptional<Date>;

  declare problemSet?: NonAttribute<ProblemSet>;
  declare user?: NonAttribute<User>;
  declare delivery?: NonAttribute<Delivery | null>;
}

/** Binds the model to a connection. */
export function initScoreReport(sequelize: Sequelize): void {
  ScoreReport.init(
    {
      id: identifier(),
      problemSetId: reference(),
      userId: reference(),
      revision: required(DataTypes.INTEGER),
      content: required(DataTypes.JSONB),
      reason: required(DataTypes.TEXT),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'ScoreReport', tableName: 'score_reports', underscored: true, timestamps: false },
  );
}
