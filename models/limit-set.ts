import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';
import type { LimitOverrides } from '@/lib/limits';

/** Only ever inserted; the highest number is in force. */
export class LimitSet extends Model<InferAttributes<LimitSet>, InferCreationAttributes<LimitSet>> {
  declare agency_id: string;
  declare number: number;
  declare name: string;
  declare overrides: LimitOverrides;
  declare acceptance_max_ohm: number | null;
  declare authority: string | null;
  declare set_at: Date;
  declare set_by: string | null;
}

export const defineLimitSet = (sequelize: Sequelize) =>
  LimitSet.init(
    {
      agency_id: { type: DataTypes.CHAR(36), primaryKey: true },
      number: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
      name: { type: DataTypes.STRING(200), allowNull: false },
      overrides: { type: DataTypes.JSON, allowNull: false },
      acceptance_max_ohm: { type: DataTypes.DOUBLE },
      authority: { type: DataTypes.STRING(500) },
      set_at: { type: DataTypes.DATE(3), allowNull: false },
      set_by: { type: DataTypes.CHAR(36) },
    },
    { sequelize, modelName: 'LimitSet', tableName: 'limit_sets' },
  );
