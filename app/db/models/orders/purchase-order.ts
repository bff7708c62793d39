import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** An order to a supplier. */
export class PurchaseOrder extends Model<
  InferAttributes<PurchaseOrder>,
  InferCreationAttributes<PurchaseOrder>
> {
  declare id: CreationOptional<number>;
  declare number: string;
  declare supplierId: CreationOptional<number | null>;
  declare state: CreationOptional<"draft" | "sent" | "closed" | "cancelled">;
  declare orderedOn: CreationOptional<string | null>;
  declare note: CreationOptional<string>;
  declare createdAt: CreationOptional<Date>;
}

PurchaseOrder.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    number: { type: DataTypes.STRING(64), allowNull: false },
    supplierId: DataTypes.BIGINT.UNSIGNED,
    state: DataTypes.ENUM("draft", "sent", "closed", "cancelled"),
    orderedOn: DataTypes.DATEONLY,
    note: DataTypes.STRING(2000),
    createdAt: DataTypes.DATE(3),
  },
  { sequelize, tableName: "purchase_order" },
);
