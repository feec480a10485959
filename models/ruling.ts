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
import { type QueueItem } from './queue-item';
import { type RulingReversal } from './ruling-reversal';
import { type SecondMarking } from './second-marking';
import { type User } from './user';
import { defaulted, identifier, madeAt, optional, optionalReference, reference, required, wordList } from './columns';

export type RulingKind = 'single' | 'kin' | 'settlement' | 'appeal';

/** A person’s decision on an answer. It never changes; a reversal is a row of its own. */
export class Ruling extends Model<InferAttributes<Ruling>, InferCreationAttributes<Ruling>> {
  declare id: CreationOptional<string>;
  declare queueItemId: string;
  declare answerId: string;
  declare sequence: CreationOptional<number>;
  declare graderId: string;
  declare kind: RulingKind;
  declare credit: number;
  declare outOf: number;
  declare comment: CreationOptional<string>;
  declare reasons: CreationOptional<string[]>;
  declare coveringRulingId: string | null;
  declare millisecondsSpent: number | null;
  declare createdAt: CreationOptional<Date>;

  declare queueItem?: NonAttribute<QueueItem>;
  declare answer?: NonAttribute<Answer>;
  declare grader?: NonAttribute<User>;
  declare coveringRuling?: NonAttribute<Ruling | null>;
  declare coveredRulings?: NonAttribute<Ruling[]>;
  declare reversal?: NonAttribute<RulingReversal | null>;
  declare secondMarking?: NonAttribute<SecondMarking | null>;
}

/** Binds the model to a connection. */
export function initRuling(sequelize: Sequelize): void {
  Ruling.init(
    {
      id: identifier(),
      queueItemId: reference(),
      answerId: reference(),
      sequence: defaulted(DataTypes.INTEGER, 1),
      graderId: reference(),
      kind: required(DataTypes.TEXT),
      credit: required(DataTypes.INTEGER),
      outOf: required(DataTypes.INTEGER),
      comment: defaulted(DataTypes.TEXT, ''),
      reasons: wordList([]),
      coveringRulingId: optionalReference(),
      millisecondsSpent: optional(DataTypes.INTEGER),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'Ruling', tableName: 'rulings', underscored: true, timestamps: false },
  );
}
