import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** One part on a purchase order; `quantity` minus `received` is still to come unless it is closed. */
export class PurchaseOrderLine extends Model<
  InferAttributes<PurchaseOrderLine>,
  InferCreationAttributes<PurchaseOrderLine>
> {
  declare id: CreationOptional<number>;
  declare purchaseOrderId: number;
  declare lineNumber: number;
  declare partId: number;
  declare quantity: string;
  declare received: CreationOptional<string>;
  declare dueOn: CreationOptional<string | null>;
  declare unitPrice: CreationOptional<string | null>;
  declare closed: CreationOptional<boolean>;
}

PurchaseOrderLine.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    purchaseOrderId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    lineNumber: { type: DataTypes.INTEGER, allowNull: false },
    partId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    quantity: { type: DataTypes.DECIMAL(20, 6), allowNull: false },
    received: DataTypes.DECIMAL(20, 6),
    dueOn: DataTypes.DATEONLY,
    unitPrice: DataTypes.DECIMAL(20, 6),
    closed: DataTypes.BOOLEAN,
  },
  { sequelize, tableName: "purchase_order_line" },
);
