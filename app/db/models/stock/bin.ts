import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** A place on the shelves. */
export class Bin extends Model<InferAttributes<Bin>, InferCreationAttributes<Bin>> {
  declare id: CreationOptional<number>;
  declare code: string;
  declare binKey: string;
  declare zone: CreationOptional<string>;
  declare walkOrder: CreationOptional<number>;
  declare description: CreationOptional<string>;
}

Bin.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    code: { type: DataTypes.STRING(64), allowNull: false },
    binKey: { type: DataTypes.STRING(64), allowNull: false },
    zone: DataTypes.STRING(64),
    walkOrder: DataTypes.INTEGER,
    description: DataTypes.STRING(255),
  },
  { sequelize, tableName: "bin" },
);
