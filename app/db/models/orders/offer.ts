import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** What a supplier asks for a part from a quantity on. */
export class Offer extends Model<InferAttributes<Offer>, InferCreationAttributes<Offer>> {
  declare id: CreationOptional<number>;
  declare supplierId: number;
  declare partId: number;
  declare supplierPartNumber: CreationOptional<string>;
  declare buyingUnit: string;
  declare perBuyingUnit: CreationOptional<string>;
  declare minimum: CreationOptional<string | null>;
  declare multiple: CreationOptional<string | null>;
  declare fromQuantity: CreationOptional<string>;
  declare unitPrice: string;
  declare currency: string;
  declare leadTimeDays: CreationOptional<number | null>;
  declare preferred: CreationOptional<boolean>;
}

Offer.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    supplierId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    partId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    supplierPartNumber: DataTypes.STRING(120),
    buyingUnit: { type: DataTypes.STRING(8), allowNull: false },
    perBuyingUnit: DataTypes.DECIMAL(20, 6),
    minimum: DataTypes.DECIMAL(20, 6),
    multiple: DataTypes.DECIMAL(20, 6),
    fromQuantity: DataTypes.DECIMAL(20, 6),
    unitPrice: { type: DataTypes.DECIMAL(20, 6), allowNull: false },
    currency: { type: DataTypes.STRING(3), allowNull: false },
    leadTimeDays: DataTypes.INTEGER,
    preferred: DataTypes.BOOLEAN,
  },
  { sequelize, tableName: "offer" },
);
