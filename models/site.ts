import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

/** `version` counts the saves of the ground, not those of name or notes. */
export class Site extends Model<InferAttributes<Site>, InferCreationAttributes<Site>> {
  declare id: string;
  declare agency_id: string;
  declare name: string;
  declare place: string | null;
  declare notes: string | null;
  declare longitude: number | null;
  declare latitude: number | null;
  declare base_map_id: string | null;
  declare version: number;
  declare overhead_none_known_as_of: string | null;
  declare ground_saved_at: Date;
  declare ground_saved_by: string | null;
  declare created_at: Date;
  declare changed_at: Date;
}

export const defineSite = (sequelize: Sequelize) =>
  Site.init(
    {
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      agency_id: { type: DataTypes.CHAR(36), allowNull: false },
      name: { type: DataTypes.STRING(200), allowNull: false },
      place: { type: DataTypes.STRING(300) },
      notes: { type: DataTypes.TEXT },
      longitude: { type: DataTypes.DOUBLE },
      latitude: { type: DataTypes.DOUBLE },
      base_map_id: { type: DataTypes.CHAR(36) },
      version: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      overhead_none_known_as_of: { type: DataTypes.STRING(40) },
      ground_saved_at: { type: DataTypes.DATE(3), allowNull: false },
      ground_saved_by: { type: DataTypes.CHAR(36) },
      created_at: { type: DataTypes.DATE(3), allowNull: false },
      changed_at: { type: DataTypes.DATE(3), allowNull: false },
    },
    { sequelize, modelName: 'Site', tableName: 'sites' },
  );
