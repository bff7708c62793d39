import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** A signed-in browser, keyed by the hash of its id. */
export class Session extends Model<InferAttributes<Session>, InferCreationAttributes<Session>> {
  declare idHash: string;
  declare personId: number;
  /** In words, such as `Firefox on Linux`; null where the browser did not say. */
  declare browser: CreationOptional<string | null>;
  declare address: CreationOptional<string | null>;
  declare createdAt: CreationOptional<Date>;
  declare seenAt: CreationOptional<Date>;
  declare expiresAt: Date;
}

Session.init(
  {
    idHash: { type: DataTypes.STRING(64), primaryKey: true, allowNull: false },
    personId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    browser: DataTypes.STRING(60),
    address: DataTypes.STRING(64),
    createdAt: DataTypes.DATE(3),
    seenAt: DataTypes.DATE(3),
    expiresAt: { type: DataTypes.DATE(3), allowNull: false },
  },
  { sequelize, tableName: "session" },
);
