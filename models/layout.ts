import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';
import type { Layout as LayoutDocument } from '@/lib/layout';

export class Layout extends Model<InferAttributes<Layout>, InferCreationAttributes<Layout>> {
  declare id: string;
  declare agency_id: string;
  declare site_id: string;
  declare name: string | null;
  declare version: number;
  declare document: LayoutDocument;
  declare pieces: number;
  declare created_at: Date;
  declare drawn_by: string | null;
  declare saved_at: Date;
  declare saved_by: string | null;
}

export const defineLayout = (sequelize: Sequelize) =>
  Layout.init(
    {
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      agency_id: { type: DataTypes.CHAR(36), allowNull: false },
      site_id: { type: DataTypes.CHAR(36), allowNull: false },
      name: { type: DataTypes.STRING(200) },
      version: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      document: { type: DataTypes.JSON, allowNull: false },
      pieces: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
      created_at: { type: DataTypes.DATE(3), allowNull: false },
      drawn_by: { type: DataTypes.CHAR(36) },
      saved_at: { type: DataTypes.DATE(3), allowNull: false },
      saved_by: { type: DataTypes.CHAR(36) },
    },
    { sequelize, modelName: 'Layout', tableName: 'layouts' },
  );
