import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Tile extends Model<InferAttributes<Tile>, InferCreationAttributes<Tile>> {
  declare agency_id: string;
  declare hash: string;
  declare type: string;
  declare bytes: Buffer;
}

export const defineTile = (sequelize: Sequelize) =>
  Tile.init(
    {
      agency_id: { type: DataTypes.CHAR(36), primaryKey: true },
      hash: { type: DataTypes.CHAR(64), primaryKey: true },
      type: { type: DataTypes.STRING(40), allowNull: false },
      bytes: { type: DataTypes.BLOB('medium'), allowNull: false },
    },
    { sequelize, modelName: 'Tile', tableName: 'tiles' },
  );
