import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** A token for the JSON routes, kept as its hash; it belongs to a person or stands for a role. */
export class ApiToken extends Model<InferAttributes<ApiToken>, InferCreationAttributes<ApiToken>> {
  declare id: CreationOptional<number>;
  declare tokenHash: string;
  declare personId: CreationOptional<number | null>;
  declare role: CreationOptional<"clerk" | "planner" | "purchaser" | "builder" | "manager" | null>;
  declare name: string;
  declare createdAt: CreationOptional<Date>;
  declare revokedAt: CreationOptional<Date | null>;
}

ApiToken.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    tokenHash: { type: DataTypes.STRING(64), allowNull: false },
    personId: DataTypes.BIGINT.UNSIGNED,
    role: DataTypes.ENUM("clerk", "planner", "purchaser", "builder", "manager"),
    name: { type: DataTypes.STRING(120), allowNull: false },
    createdAt: DataTypes.DATE(3),
    revokedAt: DataTypes.DATE(3),
  },
  { sequelize, tableName: "api_token" },
);
