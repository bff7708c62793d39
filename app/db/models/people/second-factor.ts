import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** What a person's authenticator shares with us, sealed; it counts once it is confirmed by a code. */
export class SecondFactor extends Model<
  InferAttributes<SecondFactor>,
  InferCreationAttributes<SecondFactor>
> {
  declare personId: number;
  declare sealedSecret: string;
  /** The last 30-second step whose code was used: that code and older ones count no more. */
  declare lastStep: CreationOptional<number>;
  declare createdAt: CreationOptional<Date>;
  declare confirmedAt: CreationOptional<Date | null>;
}

SecondFactor.init(
  {
    personId: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, allowNull: false },
    sealedSecret: { type: DataTypes.STRING(255), allowNull: false },
    lastStep: DataTypes.BIGINT.UNSIGNED,
    createdAt: DataTypes.DATE(3),
    confirmedAt: DataTypes.DATE(3),
  },
  { sequelize, tableName: "second_factor" },
);
