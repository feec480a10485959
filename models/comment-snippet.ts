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
import { identifier, madeAt, reference, required } from './columns';

/** A comment that the graders of a set share. */
export class CommentSnippet extends Model<InferAttributes<CommentSnippet>, InferCreationAttributes<CommentSnippet>> {
  declare id: CreationOptional<string>;
  declare problemSetId: string;
  declare text: string;
  declare createdBy: string;
  declare createdAt: CreationOptional<Date>;

  declare problemSet?: NonAttribute<ProblemSet>;
}

/** Binds the model to a connection. */
export function initCommentSnippet(sequelize: Sequelize): void {
  CommentSnippet.init(
    {
      id: identifier(),
      problemSetId: reference(),
      text: required(DataTypes.TEXT),
      createdBy: reference(),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'CommentSnippet', tableName: 'comment_snippets', underscored: true, timestamps: false },
  );
}
