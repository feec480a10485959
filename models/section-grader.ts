import {
  Model,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type Membership } from './membership';
import { type Section } from './section';
import { identifier, madeAt, reference } from './columns';

/** A TA who grades a section. */
export class SectionGrader extends Model<InferAttributes<SectionGrader>, InferCreationAttributes<SectionGrader>> {
  declare id: CreationOptional<string>;
  declare courseId: string;
  declare sectionId: string;
  declare membershipId: string;
  declare createdAt: CreationOptional<Date>;

  declare section?: NonAttribute<Section>;
  declare membership?: NonAttribute<Membership>;
}

/** Binds the model to a connection. */
export function initSectionGrader(sequelize: Sequelize): void {
  SectionGrader.init(
    {
      id: identifier(),
      courseId: reference(),
      sectionId: reference(),
      membershipId: reference(),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'SectionGrader', tableName: 'section_graders', underscored: true, timestamps: false },
  );
}
