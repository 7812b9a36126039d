import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Kit extends Model<InferAttributes<Kit>, InferCreationAttributes<Kit>> {
  declare id: string;
  declare agency_id: string;
  declare name: string;
  declare created_at: Date;
}

export const defineKit = (sequelize: Sequelize) =>
  Kit.init(
    {
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      agency_id: { type: DataTypes.CHAR(36), allowNull: false },
      name: { type: DataTypes.STRING(200), allowNull: false },
      created_at: { type: DataTypes.DATE(3), allowNull: false },
    },
    { sequelize, modelName: 'Kit', tableName: 'kits' },
  );
