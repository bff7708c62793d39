import { DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "~/db/client.server";

/** A number that every change of its subject raises. */
export class Revision extends Model<InferAttributes<Revision>, InferCreationAttributes<Revision>> {
  declare name: string;
  declare value: number;
}

Revision.init(
  {
    name: { type: DataTypes.STRING(30), primaryKey: true, allowNull: false },
    value: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
  },
  { sequelize, tableName: "revision" },
);
