import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';
import type { Layout as LayoutDocument } from '@/lib/layout';

/** Only ever inserted: one row for every version there has been. */
export class LayoutChange extends Model<
  InferAttributes<LayoutChange>,
  InferCreationAttributes<LayoutChange>
> {
  declare layout_id: string;
  declare version: number;
  declare agency_id: string;
  declare label: string;
  declare document: LayoutDocument;
  declare at: Date;
  declare person_id: string | null;
}

export const defineLayoutChange = (sequelize: Sequelize) =>
  LayoutChange.init(
    {
      layout_id: { type: DataTypes.CHAR(36), primaryKey: true },
      version: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
      agency_id: { type: DataTypes.CHAR(36), allowNull: false },
      label: { type: DataTypes.STRING(200), allowNull: false },
      document: { type: DataTypes.JSON, allowNull: false },
      at: { type: DataTypes.DATE(3), allowNull: false },
      person_id: { type: DataTypes.CHAR(36) },
    },
    { sequelize, modelName: 'LayoutChange', tableName: 'layout_changes' },
  );
