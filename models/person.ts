import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Person extends Model<InferAttributes<Person>, InferCreationAttributes<Person>> {
  declare id: string;
  declare agency_id: string;
  declare email: string;
  declare name: string;
  declare password_hash: string;
  declare created_at: Date;
  declare disabled_at: Date | null;
}

export const definePerson = (sequelize: Sequelize) =>
  Person.init(
    {
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      agency_id: { type: DataTypes.CHAR(36), allowNull: false },
      email: { type: DataTypes.STRING(254), allowNull: false },
      name: { type: DataTypes.STRING(200), allowNull: false },
      password_hash: { type: DataTypes.STRING(255), allowNull: false },
      created_at: { type: DataTypes.DATE(3), allowNull: false },
      disabled_at: { type: DataTypes.DATE(3) },
    },
    { sequelize, modelName: 'Person', tableName: 'people' },
  );
