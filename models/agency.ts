import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Agency extends Model<InferAttributes<Agency>, InferCreationAttributes<Agency>> {
  declare id: string;
  declare name: string;
  declare created_at: Date;
}

export const defineAgency = (sequelize: Sequelize) =>
  Agency.init(
    {
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      name: { type: DataTypes.STRING(200), allowNull: false },
      created_at: { type: DataTypes.DATE(3), allowNull: false },
    },
    { sequelize, modelName: 'Agency', tableName: 'agencies' },
  );
