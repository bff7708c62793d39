import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";
import type { BalanceState, Place } from "~/domain/stock/types";

/** One side of a movement: into a place with a plus, out of it with a minus. */
export class MovementLeg extends Model<InferAttributes<MovementLeg>, InferCreationAttributes<MovementLeg>> {
  declare id: CreationOptional<number>;
  declare movementId: number;
  declare partId: number;
  declare lotId: number;
  declare binId: CreationOptional<number | null>;
  declare place: Place;
  declare state: CreationOptional<BalanceState | null>;
  declare quantity: string;
  declare sequence: CreationOptional<number | null>;
}

MovementLeg.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    movementId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    partId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    lotId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    binId: DataTypes.BIGINT.UNSIGNED,
    place: {
      type: DataTypes.ENUM("bin", "supplier", "customer", "scrap", "adjustment", "in-work"),
      allowNull: false,
    },
    state: DataTypes.ENUM("usable", "held", "staged", "with-supplier"),
    quantity: { type: DataTypes.DECIMAL(20, 6), allowNull: false },
    sequence: DataTypes.BIGINT.UNSIGNED,
  },
  { sequelize, tableName: "movement_leg" },
);
