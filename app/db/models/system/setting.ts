import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** A setting of the shop. A value is replaced whole: one changed in place is not saved. */
export class Setting extends Model<InferAttributes<Setting>, InferCreationAttributes<Setting>> {
  declare name: string;
  declare value: unknown;
  declare changedAt: CreationOptional<Date>;
}

Setting.init(
  {
    name: { type: DataTypes.STRING(64), primaryKey: true, allowNull: false },
    value: { type: DataTypes.JSON, allowNull: false },
    changedAt: DataTypes.DATE(3),
  },
  { sequelize, tableName: "setting" },
);
