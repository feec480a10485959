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
import { type Section } from './section';
import { type User } from './user';
import { defaulted, identifier, madeAt, optionalReference, reference, required } from './columns';

/** A later closing time for one student or one section. */
export class Extension extends Model<InferAttributes<Extension>, InferCreationAttributes<Extension>> {
  declare id: CreationOptional<string>;
  declare problemSetId: string;
  declare userId: string | null;
  declare sectionId: string | null;
  declare closesAt: Date;
  declare reason: CreationOptional<string>;
  declare grantedBy: string;
  declare createdAt: CreationOptional<Date>;

  declare problemSet?: NonAttribute<ProblemSet>;
  declare user?: NonAttribute<User | null>;
  declare section?: NonAttribute<Section | null>;
}

/** Binds the model to a connection. */
export function initExtension(sequelize: Sequelize): void {
  Extension.init(
    {
      id: identifier(),
      problemSetId: reference(),
      userId: optionalReference(),
      sectionId: optionalReference(),
      closesAt: required(DataTypes.DATE),
      reason: defaulted(DataTypes.TEXT, ''),
      grantedBy: reference(),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'Extension', tableName: 'extensions', underscored: true, timestamps: false },
  );
}
