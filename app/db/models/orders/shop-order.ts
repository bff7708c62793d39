import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** An order to the bench to build a part. */
export class ShopOrder extends Model<InferAttributes<ShopOrder>, InferCreationAttributes<ShopOrder>> {
  declare id: CreationOptional<number>;
  declare number: string;
  declare partId: number;
  declare quantity: string;
  declare finished: CreationOptional<string>;
  declare dueOn: CreationOptional<string | null>;
  declare state: CreationOptional<"planned" | "released" | "finished" | "cancelled">;
  declare createdAt: CreationOptional<Date>;
}

ShopOrder.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    number: { type: DataTypes.STRING(64), allowNull: false },
    partId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    quantity: { type: DataTypes.DECIMAL(20, 6), allowNull: false },
    finished: DataTypes.DECIMAL(20, 6),
    dueOn: DataTypes.DATEONLY,
    state: DataTypes.ENUM("planned", "released", "finished", "cancelled"),
    createdAt: DataTypes.DATE(3),
  },
  { sequelize, tableName: "shop_order" },
);
