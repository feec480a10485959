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
import { type Membership } from './membership';
import { type SectionGrader } from './section-grader';
import { identifier, madeAt, reference, required } from './columns';

/** A section of a course: some of its students, marked by some of its TAs. */
export class Section extends Model<InferAttributes<Section>, InferCreationAttributes<Section>> {
  declare id: CreationOptional<string>;
  declare courseId: string;
  declare name: string;
  declare createdAt: CreationOptional<Date>;

  declare course?: NonAttribute<Course>;
  declare memberships?: NonAttribute<Membership[]>;
  declare graders?: NonAttribute<SectionGrader[]>;
}

/** Binds the model to a connection. */
export function initSection(sequelize: Sequelize): void {
  Section.init(
    {
      id: identifier(),
      courseId: reference(),
      name: required(DataTypes.TEXT),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'Section', tableName: 'sections', underscored: true, timestamps: false },
  );
}
