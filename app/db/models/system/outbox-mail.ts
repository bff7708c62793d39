import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** A mail waiting to be sent under its fixed Message-ID. */
export class OutboxMail extends Model<InferAttributes<OutboxMail>, InferCreationAttributes<OutboxMail>> {
  declare id: CreationOptional<number>;
  declare messageId: string;
  declare toAddress: string;
  declare subject: string;
  declare body: string;
  declare state: CreationOptional<"waiting" | "sent" | "caught" | "dead">;
  declare tries: CreationOptional<number>;
  declare nextAt: CreationOptional<Date>;
  declare leaseUntil: CreationOptional<Date | null>;
  declare createdAt: CreationOptional<Date>;
  declare endedAt: CreationOptional<Date | null>;
  /** Why the last try failed. */
  declare fault: CreationOptional<string | null>;
}

OutboxMail.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    messageId: { type: DataTypes.STRING(190), allowNull: false },
    toAddress: { type: DataTypes.STRING(190), allowNull: false },
    subject: { type: DataTypes.STRING(255), allowNull: false },
    body: { type: DataTypes.TEXT, allowNull: false },
    state: DataTypes.ENUM("waiting", "sent", "caught", "dead"),
    tries: DataTypes.INTEGER,
    nextAt: DataTypes.DATE(3),
    leaseUntil: DataTypes.DATE(3),
    createdAt: DataTypes.DATE(3),
    endedAt: DataTypes.DATE(3),
    fault: DataTypes.STRING(255),
  },
  { sequelize, tableName: "outbox" },
);
