import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';
import type { Locate as LocateDocument } from '@/lib/layout';

export class Locate extends Model<InferAttributes<Locate>, InferCreationAttributes<Locate>> {
  declare site_id: string;
  declare place: number;
  declare agency_id: string;
  declare ticket: string;
  declare entry: LocateDocument;
}

export const defineLocate = (sequelize: Sequelize) =>
  Locate.init(
    {
      site_id: { type: DataTypes.CHAR(36), primaryKey: true },
      place: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
      agency_id: { type: DataTypes.CHAR(36), allowNull: false },
      ticket: { type: DataTypes.STRING(100), allowNull: false },
      entry: { type: DataTypes.JSON, allowNull: false },
    },
    { sequelize, modelName: 'Locate', tableName: 'locates' },
  );
