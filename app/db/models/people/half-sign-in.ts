import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** A browser that has shown the right password and still owes the code, keyed by the hash of its id. */
export class HalfSignIn extends Model<InferAttributes<HalfSignIn>, InferCreationAttributes<HalfSignIn>> {
  declare idHash: string;
  declare personId: number;
  declare createdAt: CreationOptional<Date>;
  declare expiresAt: Date;
}

HalfSignIn.init(
  {
    idHash: { type: DataTypes.STRING(64), primaryKey: true, allowNull: false },
    personId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    createdAt: DataTypes.DATE(3),
    expiresAt: { type: DataTypes.DATE(3), allowNull: false },
  },
  { sequelize, tableName: "half_sign_in" },
);
