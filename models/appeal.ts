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
import { type Draw } from './draw';
import { type ProblemSet } from './problem-set';
import { type Ruling } from './ruling';
import { type SetRelease } from './set-release';
import { type User } from './user';
import { defaulted, identifier, madeAt, optional, optionalReference, reference, required } from './columns';

export type AppealState = 'open' | 'answered';

export type AppealOutcome = 'upheld' | 'kept' | 'lowered';

/** A student’s request that a person look at one part again. */
export class Appeal extends Model<InferAttributes<Appeal>, InferCreationAttributes<Appeal>> {
  declare id: CreationOptional<string>;
  declare setReleaseId: string;
  declare problemSetId: string;
  declare answerId: string;
  declare drawId: string;
  declare partKey: string;
  declare userId: string;
  declare reason: string;
  declare state: CreationOptional<AppealState>;
  declare outcome: AppealOutcome | null;
  declare reply: string | null;
  declare answeredBy: string | null;
  declare answeredAt: Date | null;
  declare rulingId: string | null;
  declare sameGraderNoted: CreationOptional<boolean>;
  declare createdAt: CreationOptional<Date>;

  declare setRelease?: NonAttribute<SetRelease>;
  declare problemSet?: NonAttribute<ProblemSet>;
  declare answer?: NonAttribute<Answer>;
  declare draw?: NonAttribute<Draw>;
  declare user?: NonAttribute<User>;
  declare answerer?: NonAttribute<User | null>;
  declare ruling?: NonAttribute<Ruling | null>;
}

/** Binds the model to a connection. */
export function initAppeal(sequelize: Sequelize): void {
  Appeal.init(
    {
      id: identifier(),
      setReleaseId: reference(),
      problemSetId: reference(),
      answerId: reference(),
      drawId: reference(),
      partKey: required(DataTypes.TEXT),
      userId: reference(),
      reason: required(DataTypes.TEXT),
      state: defaulted(DataTypes.TEXT, 'open'),
      outcome: optional(DataTypes.TEXT),
      reply: optional(DataTypes.TEXT),
      answeredBy: optionalReference(),
      answeredAt: optional(DataTypes.DATE),
      rulingId: optionalReference(),
      sameGraderNoted: defaulted(DataTypes.BOOLEAN, false),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'Appeal', tableName: 'appeals', underscored: true, timestamps: false },
  );
}
