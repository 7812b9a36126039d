import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';
import type { SiteFeature as SiteFeatureDocument } from '@/lib/layout';

/** `place` orders the features of a site; gaps are allowed. */
export class SiteFeature extends Model<
  InferAttributes<SiteFeature>,
  InferCreationAttributes<SiteFeature>
> {
  declare site_id: string;
  declare feature_id: string;
  declare agency_id: string;
  declare kind: string;
  declare place: number;
  declare feature: SiteFeatureDocument;
}

export const defineSiteFeature = (sequelize: Sequelize) =>
  SiteFeature.init(
    {
      site_id: { type: DataTypes.CHAR(36), primaryKey: true },
      feature_id: { type: DataTypes.STRING(200), primaryKey: true },
      agency_id: { type: DataTypes.CHAR(36), allowNull: false },
      kind: { type: DataTypes.STRING(30), allowNull: false },
      place: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      feature: { type: DataTypes.JSON, allowNull: false },
    },
    { sequelize, modelName: 'SiteFeature', tableName: 'site_features' },
  );
