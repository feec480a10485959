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
import { identifier, madeAt, optional, optionalReference, reference, required } from './columns';

export type LinkPurpose = 'invitation' | 'reset';

/** A link by mail that lets a person set a password, once, until it expires. The link carries a signature of `id`; no secret is kept. */
export class LinkToken extends Model<InferAttributes<LinkToken>, InferCreationAttributes<LinkToken>> {
  declare id: CreationOptional<string>;
  declare userId: string;
  declare purpose: LinkPurpose;
  declare expiresAt: Date;
  declare usedAt: Date | null;
  declare createdBy: string | null;
  declare createdAt: CreationOptional<Date>;

  declare user?: NonAttribute<User>;
}

/** Binds the model to a connection. */
export function initLinkToken(sequelize: Sequelize): void {
  LinkToken.init(
    {
      id: identifier(),
      userId: reference(),
      purpose: required(DataTypes.TEXT),
      expiresAt: required(DataTypes.DATE),
      usedAt: optional(DataTypes.DATE),
      createdBy: optionalReference(),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'LinkToken', tableName: 'link_tokens', underscored: true, timestamps: false },
  );
}
