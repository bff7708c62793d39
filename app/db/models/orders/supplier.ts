import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** A firm that parts are bought from. */
export class Supplier extends Model<InferAttributes<Supplier>, InferCreationAttributes<Supplier>> {
  declare id: CreationOptional<number>;
  declare code: string;
  declare supplierKey: string;
  declare name: string;
  declare email: CreationOptional<string>;
  declare phone: CreationOptional<string>;
  declare currency: string;
  declare leadTimeDays: CreationOptional<number | null>;
  declare note: CreationOptional<string>;
}

Supplier.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    code: { type: DataTypes.STRING(64), allowNull: false },
    supplierKey: { type: DataTypes.STRING(64), allowNull: false },
    name: { type: DataTypes.STRING(255), allowNull: false },
    email: DataTypes.STRING(190),
    phone: DataTypes.STRING(64),
    currency: { type: DataTypes.STRING(3), allowNull: false },
    leadTimeDays: DataTypes.INTEGER,
    note: DataTypes.STRING(2000),
  },
  { sequelize, tableName: "supplier" },
);
