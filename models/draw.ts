import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type DrawnValues } from '@/lib/templates/content';
import { type Answer } from './answer';
import { type ProblemSetItem } from './problem-set-item';
import { type SavedAnswer } from './saved-answer';
import { type Submission } from './submission';
import { type TemplateVersion } from './template-version';
import { type User } from './user';
import { identifier, madeAt, reference, required } from './columns';

/** One student’s drawn values for one item, reproducible from the seed. */
export class Draw extends Model<InferAttributes<Draw>, InferCreationAttributes<Draw>> {
  declare id: CreationOptional<string>;
  declare itemId: string;
  declare userId: string;
  declare templateVersionId: string;
  declare seed: string;
  declare drawnValues: DrawnValues;
  declare createdAt: CreationOptional<Date>;

  declare item?: NonAttribute<ProblemSetItem>;
  declare user?: NonAttribute<User>;
  declare templateVersion?: NonAttribute<TemplateVersion>;
  declare savedAnswers?: NonAttribute<SavedAnswer[]>;
  declare submissions?: NonAttribute<Submission[]>;
  declare answers?: NonAttribute<Answer[]>;
}

/** Binds the model to a connection. */
export function initDraw(sequelize: Sequelize): void {
  Draw.init(
    {
      id: identifier(),
      itemId: reference(),
      userId: reference(),
      templateVersionId: reference(),
      seed: required(DataTypes.TEXT),
      drawnValues: required(DataTypes.JSONB),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'Draw', tableName: 'draws', underscored: true, timestamps: false },
  );
}
