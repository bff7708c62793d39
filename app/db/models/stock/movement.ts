import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";
import type { MovementKind } from "~/domain/stock/types";

/** A fact about stock, never changed. Written by the posting function only. */
export class Movement extends Model<InferAttributes<Movement>, InferCreationAttributes<Movement>> {
  declare id: CreationOptional<number>;
  declare kind: MovementKind;
  declare happenedAt: Date;
  declare enteredAt: CreationOptional<Date>;
  declare personId: CreationOptional<number | null>;
  declare reason: CreationOptional<string>;
  declare reference: CreationOptional<string>;
  declare reverses: CreationOptional<number | null>;
  declare idempotencyKeyId: number;
  declare line: number;
}

Movement.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    kind: {
      type: DataTypes.ENUM(
        "receive",
        "return",
        "issue",
        "scrap",
        "move",
        "hold",
        "release",
        "adjust",
        "reverse",
      ),
      allowNull: false,
    },
    happenedAt: { type: DataTypes.DATE(3), allowNull: false },
    enteredAt: DataTypes.DATE(3),
    personId: DataTypes.BIGINT.UNSIGNED,
    reason: DataTypes.STRING(500),
    reference: DataTypes.STRING(120),
    reverses: DataTypes.BIGINT.UNSIGNED,
    idempotencyKeyId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    line: { type: DataTypes.INTEGER, allowNull: false },
  },
  { sequelize, tableName: "movement" },
);
