import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** An order of one kit. */
export class KitOrder extends Model<InferAttributes<KitOrder>, InferCreationAttributes<KitOrder>> {
  declare id: CreationOptional<number>;
  declare number: string;
  declare partId: number;
  declare customer: CreationOptional<string>;
  declare serial: CreationOptional<string | null>;
  declare wantedOn: CreationOptional<string | null>;
  declare priority: CreationOptional<number>;
  declare state: CreationOptional<"open" | "shipped" | "cancelled">;
  declare note: CreationOptional<string>;
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
}

KitOrder.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    number: { type: DataTypes.STRING(64), allowNull: false },
    partId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    customer: DataTypes.STRING(255),
    serial: DataTypes.STRING(64),
    wantedOn: DataTypes.DATEONLY,
    priority: DataTypes.INTEGER,
    state: DataTypes.ENUM("open", "shipped", "cancelled"),
    note: DataTypes.STRING(2000),
    version: DataTypes.INTEGER,
    createdAt: DataTypes.DATE(3),
  },
  { sequelize, tableName: "kit_order" },
);
