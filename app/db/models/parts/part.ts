import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";
import type { Sourcing } from "~/domain/planning/types";

/** One thing with one part number. Quantities, costs and masses are decimal strings. */
export class Part extends Model<InferAttributes<Part>, InferCreationAttributes<Part>> {
  declare id: CreationOptional<number>;
  declare partNumber: string;
  declare partKey: string;
  declare description: CreationOptional<string>;
  declare sourcing: Sourcing;
  declare unit: CreationOptional<string>;
  declare decimals: CreationOptional<number>;
  declare leadTimeDays: CreationOptional<number>;
  declare safetyStock: CreationOptional<string>;
  declare lotRule: CreationOptional<"lot-for-lot" | "fixed-period">;
  declare lotMinimum: CreationOptional<string | null>;
  declare lotMultiple: CreationOptional<string | null>;
  declare lotMaximum: CreationOptional<string | null>;
  declare lotDays: CreationOptional<number | null>;
  declare yield: CreationOptional<string>;
  declare unitCost: CreationOptional<string | null>;
  declare massKg: CreationOptional<string | null>;
  declare sold: CreationOptional<boolean>;
  declare version: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
}

Part.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    partNumber: { type: DataTypes.STRING(120), allowNull: false },
    partKey: { type: DataTypes.STRING(120), allowNull: false },
    description: DataTypes.STRING(255),
    sourcing: { type: DataTypes.ENUM("buy", "make", "phantom"), allowNull: false },
    unit: DataTypes.STRING(8),
    decimals: DataTypes.INTEGER,
    leadTimeDays: DataTypes.INTEGER,
    safetyStock: DataTypes.DECIMAL(20, 6),
    lotRule: DataTypes.ENUM("lot-for-lot", "fixed-period"),
    lotMinimum: DataTypes.DECIMAL(20, 6),
    lotMultiple: DataTypes.DECIMAL(20, 6),
    lotMaximum: DataTypes.DECIMAL(20, 6),
    lotDays: DataTypes.INTEGER,
    yield: DataTypes.DECIMAL(9, 8),
    unitCost: DataTypes.DECIMAL(20, 6),
    massKg: DataTypes.DECIMAL(20, 9),
    sold: DataTypes.BOOLEAN,
    version: DataTypes.INTEGER,
    createdAt: DataTypes.DATE(3),
  },
  { sequelize, tableName: "part" },
);
