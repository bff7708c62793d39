import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** Who did what to which thing; only ever added to. */
export class AuditEvent extends Model<InferAttributes<AuditEvent>, InferCreationAttributes<AuditEvent>> {
  declare id: CreationOptional<number>;
  declare at: CreationOptional<Date>;
  declare actorId: CreationOptional<number | null>;
  declare act: string;
  declare subject: string;
  declare before: CreationOptional<Record<string, unknown> | null>;
  declare after: CreationOptional<Record<string, unknown> | null>;
}

AuditEvent.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    at: DataTypes.DATE(3),
    actorId: DataTypes.BIGINT.UNSIGNED,
    act: { type: DataTypes.STRING(64), allowNull: false },
    subject: { type: DataTypes.STRING(200), allowNull: false },
    before: DataTypes.JSON,
    after: DataTypes.JSON,
  },
  { sequelize, tableName: "audit_event" },
);
