import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type Course } from './course';
import { type User } from './user';
import { identifier, madeAt, optional, reference, required, wordList } from './columns';

/** A token for outside callers: good for one course and some scopes, kept as a SHA-256 hash. */
export class ApiToken extends Model<InferAttributes<ApiToken>, InferCreationAttributes<ApiToken>> {
  declare id: CreationOptional<string>;
  declare courseId: string;
  declare name: string;
  declare tokenHash: string;
  declare scopes: string[];
  declare createdBy: string;
  declare expiresAt: Date;
  declare revokedAt: Date | null;
  declare lastUsedAt: Date | null;
  declare createdAt: CreationOptional<Date>;

  declare course?: NonAttribute<Course>;
  declare creator?: NonAttribute<User>;
}

/** Binds the model to a connection. */
export function initApiToken(sequelize: Sequelize): void {
  ApiToken.init(
    {
      id: identifier(),
      courseId: reference(),
      name: required(DataTypes.TEXT),
      tokenHash: required(DataTypes.TEXT),
      scopes: wordList(),
      createdBy: reference(),
      expiresAt: required(DataTypes.DATE),
      revokedAt: optional(DataTypes.DATE),
      lastUsedAt: optional(DataTypes.DATE),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'ApiToken', tableName: 'api_tokens', underscored: true, timestamps: false },
  );
}
