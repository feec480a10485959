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
import { type Template } from './template';
import { identifier, madeAt, required } from './columns';

/** A department, which owns courses and a shelf of templates. */
export class Department extends Model<InferAttributes<Department>, InferCreationAttributes<Department>> {
  declare id: CreationOptional<string>;
  declare name: string;
  declare createdAt: CreationOptional<Date>;

  declare courses?: NonAttribute<Course[]>;
  declare templates?: NonAttribute<Template[]>;
}

/** Binds the model to a connection. */
export function initDepartment(sequelize: Sequelize): void {
  Department.init(
    {
      id: identifier(),
      name: required(DataTypes.TEXT),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'Department', tableName: 'departments', underscored: true, timestamps: false },
  );
}
