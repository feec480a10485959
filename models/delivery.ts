import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type ScoreReport } from './score-report';
import { defaulted, identifier, madeAt, optional, reference, required } from './columns';

export type DeliveryState = 'waiting' | 'sending' | 'sent' | 'unconfirmed' | 'failed';

/** The one e-mail of a score report. */
export class Delivery extends Model<InferAttributes<Delivery>, InferCreationAttributes<Delivery>> {
  declare id: CreationOptional<string>;
  declare scoreReportId: string;
  declare state: CreationOptional<DeliveryState>;
  declare messageId: string;
  declare attempts: CreationOptional<number>;
  declare lastError: string | null;
  declare sendingAt: Date | null;
  declare sentAt: Date | null;
  declare createdAt: CreationOptional<Date>;

  declare scoreReport?: NonAttribute<ScoreReport>;
}

/** Binds the model to a connection. */
export function initDelivery(sequelize: Sequelize): void {
  Delivery.init(
    {
      id: identifier(),
      scoreReportId: reference(),
      state: defaulted(DataTypes.TEXT, 'waiting'),
      messageId: required(DataTypes.TEXT),
      attempts: defaulted(DataTypes.INTEGER, 0),
      lastError: optional(DataTypes.TEXT),
      sendingAt: optional(DataTypes.DATE),
      sentAt: optional(DataTypes.DATE),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'Delivery', tableName: 'deliveries', underscored: true, timestamps: false },
  );
}
