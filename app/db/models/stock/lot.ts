import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** A part's lot; the one with the empty code is for stock without lots. */
export class Lot extends Model<InferAttributes<Lot>, InferCreationAttributes<Lot>> {
  declare id: CreationOptional<number>;
  declare partId: number;
  declare lotCode: CreationOptional<string>;
  declare expiresOn: CreationOptional<string | null>;
  declare createdAt: CreationOptional<Date>;
}

Lot.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    partId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    lotCode: DataTypes.STRING(80),
    expiresOn: DataTypes.DATEONLY,
    createdAt: DataTypes.DATE(3),
  },
  { sequelize, tableName: "lot" },
);
