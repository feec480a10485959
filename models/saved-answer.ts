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
import { defaulted, identifier, madeAt, reference, required } from './columns';

/** What a student has typed for a part and not handed in. */
export class SavedAnswer extends Model<InferAttributes<SavedAnswer>, InferCreationAttributes<SavedAnswer>> {
  declare id: CreationOptional<string>;
  declare drawId: string;
  declare partKey: string;
  declare text: string;
  declare revision: CreationOptional<number>;
  declare savedAt: CreationOptional<Date>;

  declare draw?: NonAttribute<Draw>;
}

/** Binds the model to a connection. */
export function initSavedAnswer(sequelize: Sequelize): void {
  SavedAnswer.init(
    {
      id: identifier(),
      drawId: reference(),
      partKey: required(DataTypes.TEXT),
      text: required(DataTypes.TEXT),
      revision: defaulted(DataTypes.INTEGER, 1),
      savedAt: madeAt(),
    },
    { sequelize, modelName: 'SavedAnswer', tableName: 'saved_answers', underscored: true, timestamps: false },
  );
}
