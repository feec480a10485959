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
import { defaulted, identifier, madeAt, reference } from './columns';

/** A grader who must not mark a student in a course. */
export class ConflictOfInterest extends Model<
  InferAttributes<ConflictOfInterest>,
  InferCreationAttributes<ConflictOfInterest>
> {
  declare id: CreationOptional<string>;
  declare courseId: string;
  declare graderId: string;
  declare studentId: string;
  declare declaredBy: string;
  declare note: CreationOptional<string>;
  declare createdAt: CreationOptional<Date>;

  declare course?: NonAttribute<Course>;
  declare grader?: NonAttribute<User>;
  declare student?: NonAttribute<User>;
}

/** Binds the model to a connection. */
export function initConflictOfInterest(sequelize: Sequelize): void {
  ConflictOfInterest.init(
    {
      id: identifier(),
      courseId: reference(),
      graderId: reference(),
      studentId: reference(),
      declaredBy: reference(),
      note: defaulted(DataTypes.TEXT, ''),
      createdAt: madeAt(),
    },
    {
      sequelize,
      modelName: 'ConflictOfInterest',
      tableName: 'conflicts_of_interest',
      underscored: true,
      timestamps: false,
    },
  );
}
