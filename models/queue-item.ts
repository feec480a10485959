import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type FlagReason } from '@/lib/domain/flag-reasons';
import { type QueueItemState } from '@/lib/domain/queue-item-state';
import { type Answer } from './answer';
import { type Appeal } from './appeal';
import { type ProblemSet } from './problem-set';
import { type ProblemSetItem } from './problem-set-item';
import { type Ruling } from './ruling';
import { type User } from './user';
import { defaulted, identifier, madeAt, optional, optionalReference, reference, required, wordList } from './columns';

export type QueueItemKind = 'review' | 'appeal';

/** An answer that needs a person. */
export class QueueItem extends Model<InferAttributes<QueueItem>, InferCreationAttributes<QueueItem>> {
  declare id: CreationOptional<string>;
  declare problemSetId: string;
  declare itemId: string;
  declare answerId: string;
  declare partKey: string;
  declare kind: QueueItemKind;
  declare state: CreationOptional<QueueItemState>;
  declare reasons: FlagReason[];
  declare kinKey: string | null;
  declare suggestedCredit: number | null;
  declare suggestedRule: string | null;
  declare heldBy: string | null;
  declare heldUntil: Date | null;
  declare question: string | null;
  declare appealId: string | null;
  declare createdAt: CreationOptional<Date>;
  declare updatedAt: CreationOptional<Date>;

  declare answer?: NonAttribute<Answer>;
  declare problemSet?: NonAttribute<ProblemSet>;
  declare item?: NonAttribute<ProblemSetItem>;
  declare holder?: NonAttribute<User | null>;
  declare appeal?: NonAttribute<Appeal | null>;
  declare rulings?: NonAttribute<Ruling[]>;
}

/** Binds the model to a connection. */
export function initQueueItem(sequelize: Sequelize): void {
  QueueItem.init(
    {
      id: identifier(),
      problemSetId: reference(),
      itemId: reference(),
      answerId: reference(),
      partKey: required(DataTypes.TEXT),
      kind: required(DataTypes.TEXT),
      state: defaulted(DataTypes.TEXT, 'waiting'),
      reasons: wordList(),
      kinKey: optional(DataTypes.TEXT),
      suggestedCredit: optional(DataTypes.INTEGER),
      suggestedRule: optional(DataTypes.TEXT),
      heldBy: optionalReference(),
      heldUntil: optional(DataTypes.DATE),
      question: optional(DataTypes.TEXT),
      appealId: optionalReference(),
      createdAt: madeAt(),
      updatedAt: madeAt(),
    },
    {
      sequelize,
      modelName: 'QueueItem',
      tableName: 'queue_items',
      underscored: true,
      timestamps: true,
      createdAt: false,
      updatedAt: 'updatedAt',
    },
  );
}
