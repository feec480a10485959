import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type CourseRole } from '@/lib/domain/roles';
import { type Course } from './course';
import { type Section } from './section';
import { type SectionGrader } from './section-grader';
import { type User } from './user';
import { identifier, madeAt, optional, optionalReference, reference, required } from './columns';

/** What one person is in one course. Leaving sets `leftAt`; the row and its work stay. */
export class Membership extends Model<InferAttributes<Membership>, InferCreationAttributes<Membership>> {
  declare id: CreationOptional<string>;
  declare courseId: string;
  declare userId: string;
  declare role: CourseRole;
  declare sectionId: string | null;
  declare leftAt: Date | null;
  declare createdAt: CreationOptional<Date>;

  declare course?: NonAttribute<Course>;
  declare user?: NonAttribute<User>;
  declare section?: NonAttribute<Section | null>;
  declare gradedSections?: NonAttribute<SectionGrader[]>;
}

/** Binds the model to a connection. */
export function initMembership(sequelize: Sequelize): void {
  Membership.init(
    {
      id: identifier(),
      courseId: reference(),
      userId: reference(),
      role: required(DataTypes.TEXT),
      sectionId: optionalReference(),
      leftAt: optional(DataTypes.DATE),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'Membership', tableName: 'memberships', underscored: true, timestamps: false },
  );
}
