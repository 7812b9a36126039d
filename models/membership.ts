import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';
import type { Role } from '@/lib/access';

export class Membership extends Model<
  InferAttributes<Membership>,
  InferCreationAttributes<Membership>
> {
  declare agency_id: string;
  declare person_id: string;
  declare role: Role;
  declare created_at: Date;
}

export const defineMembership = (sequelize: Sequelize) =>
  Membership.init(
    {
      agency_id: { type: DataTypes.CHAR(36), primaryKey: true },
      person_id: { type: DataTypes.CHAR(36), primaryKey: true },
      role: { type: DataTypes.STRING(20), allowNull: false },
      created_at: { type: DataTypes.DATE(3), allowNull: false },
    },
    { sequelize, modelName: 'Membership', tableName: 'memberships' },
  );
