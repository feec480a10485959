import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type ProblemSetState } from '@/lib/domain/problem-set-state';
import { defaultSetPolicy, type SetPolicy } from '@/lib/domain/set-policy';
import { type Course } from './course';
import { type Extension } from './extension';
import { type Intake } from './intake';
import { type ProblemSetItem } from './problem-set-item';
import { type SetRelease } from './set-release';
import { defaulted, identifier, madeAt, optional, reference, required } from './columns';

/** A problem set of a course. */
export class ProblemSet extends Model<InferAttributes<ProblemSet>, InferCreationAttributes<ProblemSet>> {
  declare id: CreationOptional<string>;
  declare courseId: string;
  declare number: number;
  declare title: string;
  declare state: CreationOptional<ProblemSetState>;
  declare opensAt: Date | null;
  declare closesAt: Date | null;
  declare appealsUntil: Date | null;
  declare attemptsAllowed: CreationOptional<number>;
  declare policy: CreationOptional<SetPolicy>;
  declare revision: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  declare course?: NonAttribute<Course>;
  declare items?: NonAttribute<ProblemSetItem[]>;
  declare extensions?: NonAttribute<Extension[]>;
  declare releases?: NonAttribute<SetRelease[]>;
  declare intakes?: NonAttribute<Intake[]>;
}

/** Binds the model to a connection. */
export function initProblemSet(sequelize: Sequelize): void {
  ProblemSet.init(
    {
      id: identifier(),
      courseId: reference(),
      number: required(DataTypes.INTEGER),
      title: required(DataTypes.TEXT),
      state: defaulted(DataTypes.TEXT, 'draft'),
      opensAt: optional(DataTypes.DATE),
      closesAt: optional(DataTypes.DATE),
      appealsUntil: optional(DataTypes.DATE),
      attemptsAllowed: defaulted(DataTypes.INTEGER, 3),
      policy: defaulted(DataTypes.JSONB, defaultSetPolicy),
      revision: defaulted(DataTypes.INTEGER, 1),
      createdAt: madeAt(),
      updatedAt: madeAt(),
    },
    {
      sequelize,
      modelName: 'ProblemSet',
      tableName: 'problem_sets',
      underscored: true,
      timestamps: true,
      createdAt: false,
      updatedAt: 'updatedAt',
    },
  );
}
