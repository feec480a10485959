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
import { identifier, madeAt, reference, required } from './columns';

/** A file kept under its content hash by the storage door. */
export class StoredFile extends Model<InferAttributes<StoredFile>, InferCreationAttributes<StoredFile>> {
  declare id: CreationOptional<string>;
  declare courseId: string;
  declare contentHash: string;
  declare byteSize: number;
  declare mediaType: string;
  declare originalName: string;
  declare uploadedBy: string;
  declare createdAt: CreationOptional<Date>;

  declare course?: NonAttribute<Course>;
}

/** Binds the model to a connection. */
export function initStoredFile(sequelize: Sequelize): void {
  StoredFile.init(
    {
      id: identifier(),
      courseId: reference(),
      contentHash: required(DataTypes.TEXT),
      byteSize: required(DataTypes.INTEGER),
      mediaType: required(DataTypes.TEXT),
      originalName: required(DataTypes.TEXT),
      uploadedBy: reference(),
      createdAt: madeAt(),
    },
    { sequelize, modelName: 'StoredFile', tableName: 'stored_files', underscored: true, timestamps: false },
  );
}
