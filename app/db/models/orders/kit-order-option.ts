import { DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "~/db/client.server";

/** An option chosen on a kit order. */
export class KitOrderOption extends Model<
  InferAttributes<KitOrderOption>,
  InferCreationAttributes<KitOrderOption>
> {
  declare kitOrderId: number;
  declare optionCode: string;
}

KitOrderOption.init(
  {
    kitOrderId: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, allowNull: false },
    optionCode: { type: DataTypes.STRING(64), primaryKey: true, allowNull: false },
  },
  { sequelize, tableName: "kit_order_option" },
);
