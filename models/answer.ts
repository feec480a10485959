import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type AnswerCheck } from './answer-check';
import { type Appeal } from './appeal';
import { type CreditEntry } from './credit-entry';
import { type Draw } from './draw';
import { type QueueItem } from './queue-item';
import { type Ruling } from './ruling';
import { type Submission } from './submission';
import { defaulted, identifier, madeAt, optional, optionalReference, reference, required } from './columns';

export type CheckState = 'waiting' | 'checked' | 'failed';

/** One attempt at one part of a draw. The standing one has no `supersededAt`. */
export class Answer extends Model<InferAttributes<Answer>, InferCreationAttributes<Answer>> {
  declare id: CreationOptional<string>;
  declare submissionId: string;
  declare drawId: string;
  declare partKey: string;
  declare attempt: number;
  declare text: string;
  declare supersededAt: Date | null;
  declare checkState: CreationOptional<CheckState>;
  declare currentCheckId: string | null;
  declare currentCreditEntryId: string | null;
  declare createdAt: CreationOptional<Date>;

  declare submission?: NonAttribute<Submission>;
  declare draw?: NonAttribute<Draw>;
  declare currentCheck?: NonAttribute<AnswerCheck | null>;
  declare currentCredit?: NonAttribute<CreditEntry | null>;
  declare checks?: NonAttribute<AnswerCheck[]>;
  declare creditEntries?: NonAttribute<CreditEntry[]>;
  declare queueItems?: NonAttribute<QueueItem[]>;
  declare rulings?: NonAttribute<Ruling[]>;
  declare appeals?: NonAttribute<Appeal[]>;
}

/** Binds the model to a connection. */
export function initAnswer(sequelize: Sequelize): void {
  Answer.init(
    {
      id: identifier(),
      submissionId: reference(),
      drawId: reference(),
      partKey: required(DataTypes.TEXT),
      attempt: required(DataTypes.INTEGER),
      text: required(DataTypes.TEXT),
      supersededAt: optional(DataTypes.DATE),
      checkState: defaulted(DataTypes.TEXT, 'waiting'),
      currentCheckId: optionalReference(),
      currentCreditEntryId: optionalReference(),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'Answer', tableName: 'answers', underscored: true, timestamps: false },
  );
}
