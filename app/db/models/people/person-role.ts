import { DataTypes, type InferAttributes, type InferCreationAttributes, Model } from "sequelize";
import { sequelize } from "~/db/client.server";

/** One of the roles of a person. */
export class PersonRole extends Model<InferAttributes<PersonRole>, InferCreationAttributes<PersonRole>> {
  declare personId: number;
  declare role: "clerk" | "planner" | "purchaser" | "builder" | "manager";
}

PersonRole.init(
  {
    personId: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, allowNull: false },
    role: {
      type: DataTypes.ENUM("clerk", "planner", "purchaser", "builder", "manager"),
      primaryKey: true,
      allowNull: false,
    },
  },
  { sequelize, tableName: "person_role" },
);
