import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** A code that stands once for the second factor, kept as its hash. */
export class RecoveryCode extends Model<
  InferAttributes<RecoveryCode>,
  InferCreationAttributes<RecoveryCode>
> {
  declare id: CreationOptional<number>;
  declare personId: number;
  declare codeHash: string;
  declare usedAt: CreationOptional<Date | null>;
}

RecoveryCode.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    personId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    codeHash: { type: DataTypes.STRING(64), allowNull: false },
    usedAt: DataTypes.DATE(3),
  },
  { sequelize, tableName: "recovery_code" },
);
