import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class TilePlace extends Model<
  InferAttributes<TilePlace>,
  InferCreationAttributes<TilePlace>
> {
  declare base_map_id: string;
  declare z: number;
  declare x: number;
  declare y: number;
  declare agency_id: string;
  declare hash: string;
}

export const defineTilePlace = (sequelize: Sequelize) =>
  TilePlace.init(
    {
      base_map_id: { type: DataTypes.CHAR(36), primaryKey: true },
      z: { type: DataTypes.TINYINT.UNSIGNED, primaryKey: true },
      x: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
      y: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
      agency_id: { type: DataTypes.CHAR(36), allowNull: false },
      hash: { type: DataTypes.CHAR(64), allowNull: false },
    },
    { sequelize, modelName: 'TilePlace', tableName: 'tile_places' },
  );
