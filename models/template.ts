import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type Department } from './department';
import { type TemplateVersion } from './template-version';
import { type User } from './user';
import { defaulted, identifier, madeAt, optional, optionalReference, reference, required, wordList } from './columns';

/** A question on a department’s shelf. `draft` is what its authors are editing; it may be unfinished. */
export class Template extends Model<InferAttributes<Template>, InferCreationAttributes<Template>> {
  declare id: CreationOptional<string>;
  declare departmentId: string;
  declare name: string;
  declare topics: CreationOptional<string[]>;
  declare draft: Record<string, unknown>;
  declare draftRevision: CreationOptional<number>;
  declare forkedFromVersionId: string | null;
  declare createdBy: string;
  declare archivedAt: Date | null;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  declare department?: NonAttribute<Department>;
  declare creator?: NonAttribute<User>;
  declare versions?: NonAttribute<TemplateVersion[]>;
}

/** Binds the model to a connection. */
export function initTemplate(sequelize: Sequelize): void {
  Template.init(
    {
      id: identifier(),
      departmentId: reference(),
      name: required(DataTypes.TEXT),
      topics: wordList([]),
      draft: required(DataTypes.JSONB),
      draftRevision: defaulted(DataTypes.INTEGER, 1),
      forkedFromVersionId: optionalReference(),
      createdBy: reference(),
      archivedAt: optional(DataTypes.DATE),
      createdAt: madeAt(),
      updatedAt: madeAt(),
    },
    {
      sequelize,
      modelName: 'Template',
      tableName: 'templates',
      underscored: true,
      timestamps: true,
      createdAt: false,
      updatedAt: 'updatedAt',
    },
  );
}
