import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** A link sent by mail with which a person sets their password once, kept as its hash. */
export class PersonLink extends Model<InferAttributes<PersonLink>, InferCreationAttributes<PersonLink>> {
  declare id: CreationOptional<number>;
  declare personId: number;
  declare kind: "invitation" | "password";
  declare linkHash: string;
  declare createdAt: CreationOptional<Date>;
  declare expiresAt: Date;
  declare usedAt: CreationOptional<Date | null>;
  declare withdrawnAt: CreationOptional<Date | null>;
}

PersonLink.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    personId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    kind: { type: DataTypes.ENUM("invitation", "password"), allowNull: false },
    linkHash: { type: DataTypes.STRING(64), allowNull: false },
    createdAt: DataTypes.DATE(3),
    expiresAt: { type: DataTypes.DATE(3), allowNull: false },
    usedAt: DataTypes.DATE(3),
    withdrawnAt: DataTypes.DATE(3),
  },
  { sequelize, tableName: "person_link" },
);
