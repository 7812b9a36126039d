import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';
import type { KitKind } from '@/lib/layout';

export class KitItem extends Model<InferAttributes<KitItem>, InferCreationAttributes<KitItem>> {
  declare kit_id: string;
  declare place: number;
  declare agency_id: string;
  declare kind: KitKind;
  declare length_ft: number | null;
  declare diameter_in: number | null;
  declare count: number;
}

export const defineKitItem = (sequelize: Sequelize) =>
  KitItem.init(
    {
      kit_id: { type: DataTypes.CHAR(36), primaryKey: true },
      place: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
      agency_id: { type: DataTypes.CHAR(36), allowNull: false },
      kind: { type: DataTypes.STRING(20), allowNull: false },
      length_ft: { type: DataTypes.DOUBLE },
      diameter_in: { type: DataTypes.DOUBLE },
      count: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    },
    { sequelize, modelName: 'KitItem', tableName: 'kit_items' },
  );
