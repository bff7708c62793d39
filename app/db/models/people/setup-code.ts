import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** The one-time code with which the first visitor becomes the manager, kept as its hash. */
export class SetupCode extends Model<InferAttributes<SetupCode>, InferCreationAttributes<SetupCode>> {
  declare id: CreationOptional<number>;
  declare codeHash: string;
  declare createdAt: CreationOptional<Date>;
  declare expiresAt: Date;
  declare usedAt: CreationOptional<Date | null>;
}

SetupCode.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    codeHash: { type: DataTypes.STRING(64), allowNull: false },
    createdAt: DataTypes.DATE(3),
    expiresAt: { type: DataTypes.DATE(3), allowNull: false },
    usedAt: DataTypes.DATE(3),
  },
  { sequelize, tableName: "setup_code" },
);
