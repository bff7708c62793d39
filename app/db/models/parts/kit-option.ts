import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** An option that a kit order may choose. */
export class KitOption extends Model<InferAttributes<KitOption>, InferCreationAttributes<KitOption>> {
  declare id: CreationOptional<number>;
  declare code: string;
  declare description: CreationOptional<string>;
}

KitOption.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    code: { type: DataTypes.STRING(64), allowNull: false },
    description: DataTypes.STRING(255),
  },
  { sequelize, tableName: "kit_option" },
);
