import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

export class Preference extends Model<
  InferAttributes<Preference>,
  InferCreationAttributes<Preference>
> {
  declare agency_id: string;
  declare person_id: string;
  declare choices: Record<string, unknown>;
  declare changed_at: Date;
}

export const definePreference = (sequelize: Sequelize) =>
  Preference.init(
    {
      agency_id: { type: DataTypes.CHAR(36), primaryKey: true },
      person_id: { type: DataTypes.CHAR(36), primaryKey: true },
      choices: { type: DataTypes.JSON, allowNull: false },
      changed_at: { type: DataTypes.DATE(3), allowNull: false },
    },
    { sequelize, modelName: 'Preference', tableName: 'preferences' },
  );
