import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** An act that is done once however often it is sent. */
export class IdempotencyKey extends Model<
  InferAttributes<IdempotencyKey>,
  InferCreationAttributes<IdempotencyKey>
> {
  declare id: CreationOptional<number>;
  declare key: string;
  declare fingerprint: string;
  declare status: CreationOptional<"running" | "done">;
  declare result: CreationOptional<unknown>;
  declare actorId: CreationOptional<number | null>;
  declare createdAt: CreationOptional<Date>;
}

IdempotencyKey.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    key: { type: DataTypes.STRING(200), allowNull: false },
    fingerprint: { type: DataTypes.STRING(64), allowNull: false },
    status: DataTypes.ENUM("running", "done"),
    result: DataTypes.JSON,
    actorId: DataTypes.BIGINT.UNSIGNED,
    createdAt: DataTypes.DATE(3),
  },
  { sequelize, tableName: "idempotency_key" },
);
