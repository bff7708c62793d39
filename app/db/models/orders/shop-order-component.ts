import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** What a shop order was promised of a component, and what it has picked of it. */
export class ShopOrderComponent extends Model<
  InferAttributes<ShopOrderComponent>,
  InferCreationAttributes<ShopOrderComponent>
> {
  declare id: CreationOptional<number>;
  declare shopOrderId: number;
  declare partId: number;
  declare promised: CreationOptional<string>;
  declare picked: CreationOptional<string>;
}

ShopOrderComponent.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    shopOrderId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    partId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    promised: DataTypes.DECIMAL(20, 6),
    picked: DataTypes.DECIMAL(20, 6),
  },
  { sequelize, tableName: "shop_order_component" },
);
