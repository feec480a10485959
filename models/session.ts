import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type User } from './user';
import { madeAt, reference, required } from './columns';

/** A signed-in browser; `id` is the SHA-256 of the opaque token in its cookie, so a copy of the table opens nothing. */
export class Session extends Model<InferAttributes<Session>, InferCreationAttributes<Session>> {
  declare id: string;
  declare userId: string;
  declare expiresAt: Date;
  declare createdAt: CreationOptional<Date>;

  declare user?: NonAttribute<User>;
}

/** Binds the model to a connection. */
export function initSession(sequelize: Sequelize): void {
  Session.init(
    {
      id: { type: DataTypes.TEXT, primaryKey: true, allowNull: false },
      userId: reference(),
      expiresAt: required(DataTypes.DATE),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'Session', tableName: 'sessions', underscored: true, timestamps: false },
  );
}
