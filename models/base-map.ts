import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

/** `bounds` is west, south, east, north in degrees. */
export class BaseMap extends Model<InferAttributes<BaseMap>, InferCreationAttributes<BaseMap>> {
  declare id: string;
  declare agency_id: string;
  declare pack: string;
  declare version: string;
  declare min_zoom: number;
  declare max_zoom: number;
  declare bounds: [number, number, number, number];
  declare attribution: string;
  declare created_at: Date;
}

export const defineBaseMap = (sequelize: Sequelize) =>
  BaseMap.init(
    {
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      agency_id: { type: DataTypes.CHAR(36), allowNull: false },
      pack: { type: DataTypes.STRING(60), allowNull: false },
      version: { type: DataTypes.STRING(64), allowNull: false },
      min_zoom: { type: DataTypes.TINYINT.UNSIGNED, allowNull: false },
      max_zoom: { type: DataTypes.TINYINT.UNSIGNED, allowNull: false },
      bounds: { type: DataTypes.JSON, allowNull: false },
      attribution: { type: DataTypes.STRING(500), allowNull: false },
      created_at: { type: DataTypes.DATE(3), allowNull: false },
    },
    { sequelize, modelName: 'BaseMap', tableName: 'base_maps' },
  );
