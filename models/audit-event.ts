import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
} from 'sequelize';
import { defaulted, madeAt, optional, optionalReference, required } from './columns';

export type AuditActorKind = 'user' | 'system' | 'token';

/** Who did what, when. Appended to, never changed. */
export class AuditEvent extends Model<InferAttributes<AuditEvent>, InferCreationAttributes<AuditEvent>> {
  declare id: CreationOptional<string>;
  declare at: CreationOptional<Date>;
  declare actorKind: AuditActorKind;
  declare actorId: string | null;
  declare courseId: string | null;
  declare action: string;
  declare subjectKind: string | null;
  declare subjectId: string | null;
  declare details: CreationOptional<Record<string, unknown>>;
}

/** Binds the model to a connection. */
export function initAuditEvent(sequelize: Sequelize): void {
  AuditEvent.init(
    {
      id: { type: DataTypes.BIGINT, primaryKey: true, autoIncrement: true, allowNull: false },
      at: madeAt(),
      actorKind: required(DataTypes.TEXT),
      actorId: optionalReference(),
      courseId: optionalReference(),
      action: required(DataTypes.TEXT),
      subjectKind: optional(DataTypes.TEXT),
      subjectId: optional(DataTypes.TEXT),
      details: defaulted(DataTypes.JSONB, {}),
    },
    { sequelize, modelName: 'AuditEvent', tableName: 'audit_events', underscored: true, timestamps: false },
  );
}
