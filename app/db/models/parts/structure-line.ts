import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from "sequelize";
import { sequelize } from "~/db/client.server";

/** One unit of the parent takes `quantity` of the component; null is "as required". */
export class StructureLine extends Model<
  InferAttributes<StructureLine>,
  InferCreationAttributes<StructureLine>
> {
  declare id: CreationOptional<number>;
  declare parentId: number;
  declare componentId: number;
  declare position: number;
  declare quantity: CreationOptional<string | null>;
  declare scrap: CreationOptional<string>;
  declare findNumber: CreationOptional<string | null>;
  declare optionCode: CreationOptional<string | null>;
  declare fromSerial: CreationOptional<string | null>;
  declare toSerial: CreationOptional<string | null>;
  declare fromDate: CreationOptional<string | null>;
  declare toDate: CreationOptional<string | null>;
}

StructureLine.init(
  {
    id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
    parentId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    componentId: { type: DataTypes.BIGINT.UNSIGNED, allowNull: false },
    position: { type: DataTypes.INTEGER, allowNull: false },
    quantity: DataTypes.DECIMAL(20, 6),
    scrap: DataTypes.DECIMAL(9, 8),
    findNumber: DataTypes.STRING(40),
    optionCode: DataTypes.STRING(64),
    fromSerial: DataTypes.STRING(64),
    toSerial: DataTypes.STRING(64),
    fromDate: DataTypes.DATEONLY,
    toDate: DataTypes.DATEONLY,
  },
  { sequelize, tableName: "structure_line" },
);
