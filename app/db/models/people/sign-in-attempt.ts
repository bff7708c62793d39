import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** One try to sign in, counted against guessing. */
export class SignInAttempt extends Model<
  InferAttributes<SignInAttempt>,
  InferCreationAttributes<SignInAttempt>
> {
  declare id: CreationOptional<number>;
  declare accountKey: string;
  declare address: string;
  declare succeeded: boolean;
  declare at: CreationOptional<Date>;
}

SignInAttempt.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    accountKey: { type: DataTypes.STRING(190), allowNull: false },
    address: { type: DataTypes.STRING(64), allowNull: false },
    succeeded: { type: DataTypes.BOOLEAN, allowNull: false },
    at: DataTypes.DATE(3),
  },
  { sequelize, tableName: "sign_in_attempt" },
);
