import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type Draw } from './draw';
import { type ProblemSet } from './problem-set';
import { type TemplateVersion } from './template-version';
import { identifier, madeAt, reference, required } from './columns';

/** One question of a set: a template version, its place, and its points in thousandths of a mark. */
export class ProblemSetItem extends Model<InferAttributes<ProblemSetItem>, InferCreationAttributes<ProblemSetItem>> {
  declare id: CreationOptional<string>;
  declare problemSetId: string;
  declare position: number;
  declare templateVersionId: string;
  declare points: number;
  declare createdAt: CreationOptional<Date>;

  declare problemSet?: NonAttribute<ProblemSet>;
  declare templateVersion?: NonAttribute<TemplateVersion>;
  declare draws?: NonAttribute<Draw[]>;
}

/** Binds the model to a connection. */
export function initProblemSetItem(sequelize: Sequelize): void {
  ProblemSetItem.init(
    {
      id: identifier(),
      problemSetId: reference(),
      position: required(DataTypes.INTEGER),
      templateVersionId: reference(),
      points: required(DataTypes.INTEGER),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'ProblemSetItem', tableName: 'problem_set_items', underscored: true, timestamps: false },
  );
}
