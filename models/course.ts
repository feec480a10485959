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
import { type Membership } from './membership';
import { type ProblemSet } from './problem-set';
import { type Section } from './section';
import { defaulted, identifier, madeAt, reference, required } from './columns';

/** A course in one term. */
export class Course extends Model<InferAttributes<Course>, InferCreationAttributes<Course>> {
  declare id: CreationOptional<string>;
  declare departmentId: string;
  declare code: string;
  declare title: string;
  declare term: string;
  declare timeZone: CreationOptional<string>;
  declare tasSeeOwnSectionsOnly: CreationOptional<boolean>;
  declare retentionMonths: CreationOptional<number>;
  declare notice: CreationOptional<string>;
  declare createdAt: CreationOptional<Date>;

  declare department?: NonAttribute<Department>;
  declare sections?: NonAttribute<Section[]>;
  declare memberships?: NonAttribute<Membership[]>;
  declare problemSets?: NonAttribute<ProblemSet[]>;
}

/** Binds the model to a connection. */
export function initCourse(sequelize: Sequelize): void {
  Course.init(
    {
      id: identifier(),
      departmentId: reference(),
      code: required(DataTypes.TEXT),
      title: required(DataTypes.TEXT),
      term: required(DataTypes.TEXT),
      timeZone: defaulted(DataTypes.TEXT, 'UTC'),
      tasSeeOwnSectionsOnly: defaulted(DataTypes.BOOLEAN, false),
      retentionMonths: defaulted(DataTypes.INTEGER, 24),
      notice: defaulted(DataTypes.TEXT, ''),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'Course', tableName: 'courses', underscored: true, timestamps: false },
  );
}
