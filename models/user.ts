import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type Membership } from './membership';
import { type Session } from './session';
import { defaulted, identifier, madeAt, optional, required } from './columns';

/** A person with an account. An erased account keeps its id, which is then a pseudonym and nothing else. */
export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: CreationOptional<string>;
  declare email: string;
  declare name: string;
  declare passwordHash: string | null;
  declare isAdministrator: CreationOptional<boolean>;
  declare passwordChangedAt: Date | null;
  declare deactivatedAt: Date | null;
  declare erasedAt: Date | null;
  declare createdAt: CreationOptional<Date>;

  declare sessions?: NonAttribute<Session[]>;
  declare memberships?: NonAttribute<Membership[]>;
}

/** Binds the model to a connection. */
export function initUser(sequelize: Sequelize): void {
  User.init(
    {
      id: identifier(),
      email: required(DataTypes.TEXT),
      name: required(DataTypes.TEXT),
      passwordHash: optional(DataTypes.TEXT),
      isAdministrator: defaulted(DataTypes.BOOLEAN, false),
      passwordChangedAt: optional(DataTypes.DATE),
      deactivatedAt: optional(DataTypes.DATE),
      erasedAt: optional(DataTypes.DATE),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'User', tableName: 'users', underscored: true, timestamps: false },
  );
}
