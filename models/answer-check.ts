import {
  Model,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
  type CreationOptional,
  type NonAttribute,
} from 'sequelize';
import { type Evidence } from '@/lib/checker/contract';
import { type Verdict } from '@/lib/domain/verdict';
import { type Answer } from './answer';
import { defaulted, identifier, madeAt, optional, reference, required } from './columns';

/** What one version of the checker found of one answer, against one template version. */
export class AnswerCheck extends Model<InferAttributes<AnswerCheck>, InferCreationAttributes<AnswerCheck>> {
  declare id: CreationOptional<string>;
  declare answerId: string;
  declare checkerVersion: string;
  declare templateVersionId: string;
  declare followThroughBasis: CreationOptional<string>;
  declare verdict: Verdict;
  declare slip: string | null;
  declare slips: CreationOptional<string[]>;
  declare kinKey: string | null;
  declare readingLatex: CreationOptional<string>;
  declare readingPlain: CreationOptional<string>;
  declare referenceLatex: CreationOptional<string>;
  declare message: string;
  declare form: 'evaluated' | 'not evaluated' | null;
  declare evidence: Evidence;
  declare followThrough: Record<string, unknown> | null;
  declare milliseconds: number;
  declare createdAt: CreationOptional<Date>;

  declare answer?: NonAttribute<Answer>;
}

/** Binds the model to a connection. */
export function initAnswerCheck(sequelize: Sequelize): void {
  AnswerCheck.init(
    {
      id: identifier(),
      answerId: reference(),
      checkerVersion: required(DataTypes.TEXT),
      templateVersionId: reference(),
      followThroughBasis: defaulted(DataTypes.TEXT, ''),
      verdict: required(DataTypes.TEXT),
      slip: optional(DataTypes.TEXT),
      slips: defaulted(DataTypes.JSONB, []),
      kinKey: optional(DataTypes.TEXT),
      readingLatex: defaulted(DataTypes.TEXT, ''),
      readingPlain: defaulted(DataTypes.TEXT, ''),
      referenceLatex: defaulted(DataTypes.TEXT, ''),
      message: required(DataTypes.TEXT),
      form: optional(DataTypes.TEXT),
      evidence: required(DataTypes.JSONB),
      followThrough: optional(DataTypes.JSONB),
      milliseconds: required(DataTypes.DOUBLE),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'AnswerCheck', tableName: 'answer_checks', underscored: true, timestamps: false },
  );
}
