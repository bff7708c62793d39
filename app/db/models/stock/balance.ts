import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";
import type { BalanceState } from "~/domain/stock/types";

/** The sum of the movement legs of one part, bin, lot and state. Written by the posting function only. */
export class Balance extends Model<InferAttributes<Balance>, InferCreationAttributes<Balance>> {
  declare id: CreationOptional<number>;
  declare partId: number;
  declare binId: number;
  declare lotId: number;
  declare state: BalanceState;
  declare quantity: CreationOptional<string>;
  declare sequence: CreationOptional<number>;
}

Balance.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    partId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    binId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    lotId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    state: { type: DataTypes.ENUM("usable", "held", "staged", "with-supplier"), allowNull: false },
    quantity: DataTypes.DECIMAL(20, 6),
    sequence: DataTypes.BIGINT.UNSIGNED,
  },
  { sequelize, tableName: "balance" },
);
