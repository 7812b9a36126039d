import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

/** Looked up on every request, so that ending one takes effect at once. */
export class Session extends Model<InferAttributes<Session>, InferCreationAttributes<Session>> {
  declare id: string;
  declare agency_id: string;
  declare person_id: string;
  declare created_at: Date;
  declare last_seen_at: Date;
  declare expires_at: Date;
  declare revoked_at: Date | null;
}

export const defineSession = (sequelize: Sequelize) =>
  Session.init(
    {
      id: { type: DataTypes.CHAR(36), primaryKey: true },
      agency_id: { type: DataTypes.CHAR(36), allowNull: false },
      person_id: { type: DataTypes.CHAR(36), allowNull: false },
      created_at: { type: DataTypes.DATE(3), allowNull: false },
      last_seen_at: { type: DataTypes.DATE(3), allowNull: false },
      expires_at: { type: DataTypes.DATE(3), allowNull: false },
      revoked_at: { type: DataTypes.DATE(3) },
    },
    { sequelize, modelName: 'Session', tableName: 'sessions' },
  );
