import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type Answer } from './answer';
import { type ProblemSet } from './problem-set';
import { type Ruling } from './ruling';
import { type User } from './user';
import { defaulted, identifier, madeAt, optional, optionalReference, reference } from './columns';

export type SecondMarkingState = 'assigned' | 'taken' | 'marked' | 'to-settle' | 'settled' | 'cancelled';

/** Blind marking of an answer by another grader, and its settling where the two differ. */
export class SecondMarking extends Model<InferAttributes<SecondMarking>, InferCreationAttributes<SecondMarking>> {
  declare id: CreationOptional<string>;
  declare rulingId: string;
  declare firstGraderId: string;
  declare problemSetId: string;
  declare answerId: string;
  declare graderId: string;
  declare state: CreationOptional<SecondMarkingState>;
  declare heldUntil: Date | null;
  declare credit: number | null;
  declare comment: CreationOptional<string>;
  declare millisecondsSpent: number | null;
  declare markedAt: Date | null;
  declare settledBy: string | null;
  declare settledCredit: number | null;
  declare settledAt: Date | null;
  declare createdAt: CreationOptional<Date>;

  declare ruling?: NonAttribute<Ruling>;
  declare answer?: NonAttribute<Answer>;
  declare problemSet?: NonAttribute<ProblemSet>;
  declare firstGrader?: NonAttribute<User>;
  declare grader?: NonAttribute<User>;
}

/** Binds the model to a connection. */
export function initSecondMarking(sequelize: Sequelize): void {
  SecondMarking.init(
    {
      id: identifier(),
      rulingId: reference(),
      firstGraderId: reference(),
      problemSetId: reference(),
      answerId: reference(),
      graderId: reference(),
      state: defaulted(DataTypes.TEXT, 'assigned'),
      heldUntil: optional(DataTypes.DATE),
      credit: optional(DataTypes.INTEGER),
      comment: defaulted(DataTypes.TEXT, ''),
      millisecondsSpent: optional(DataTypes.INTEGER),
      markedAt: optional(DataTypes.DATE),
      settledBy: optionalReference(),
      settledCredit: optional(DataTypes.INTEGER),
      settledAt: optional(DataTypes.DATE),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'SecondMarking', tableName: 'second_markings', underscored: true, timestamps: false },
  );
}
