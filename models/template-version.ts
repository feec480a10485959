import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type TemplateContent } from '@/lib/templates/content';
import { type ProblemSetItem } from './problem-set-item';
import { type Template } from './template';
import { identifier, madeAt, optional, reference, required } from './columns';

/** A published version of a template. It never changes; its sweep report is filled in once. */
export class TemplateVersion extends Model<InferAttributes<TemplateVersion>, InferCreationAttributes<TemplateVersion>> {
  declare id: CreationOptional<string>;
  declare templateId: string;
  declare number: number;
  declare content: TemplateContent;
  declare contentHash: string;
  declare publishedBy: string;
  declare publishedAt: CreationOptional<Date>;
  declare sweep: Record<string, unknown> | null;

  declare template?: NonAttribute<Template>;
  declare items?: NonAttribute<ProblemSetItem[]>;
}

/** Binds the model to a connection. */
export function initTemplateVersion(sequelize: Sequelize): void {
  TemplateVersion.init(
    {
      id: identifier(),
      templateId: reference(),
      number: required(DataTypes.INTEGER),
      content: required(DataTypes.JSONB),
      contentHash: required(DataTypes.TEXT),
      publishedBy: reference(),
      publishedAt: madeAt(),
      sweep: optional(DataTypes.JSONB),
    },
    { sequelize, modelName: 'TemplateVersion', tableName: 'template_versions', underscored: true, timestamps: false },
  );
}
