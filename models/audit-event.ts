import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

/** Only ever inserted. `facts` is the exact text that was hashed. */
export class AuditEvent extends Model<
  InferAttributes<AuditEvent>,
  InferCreationAttributes<AuditEvent>
> {
  declare agency_id: string;
  declare subject_kind: string;
  declare subject_id: string;
  declare number: number;
  declare action: string;
  declare person_id: string | null;
  declare at: Date;
  declare facts: string;
  declare previous_hash: string;
  declare hash: string;
}

export const defineAuditEvent = (sequelize: Sequelize) =>
  AuditEvent.init(
    {
      agency_id: { type: DataTypes.CHAR(36), primaryKey: true },
      subject_kind: { type: DataTypes.STRING(20), primaryKey: true },
      subject_id: { type: DataTypes.CHAR(36), primaryKey: true },
      number: { type: DataTypes.INTEGER.UNSIGNED, primaryKey: true },
      action: { type: DataTypes.STRING(40), allowNull: false },
      person_id: { type: DataTypes.CHAR(36) },
      at: { type: DataTypes.DATE(3), allowNull: false },
      facts: { type: DataTypes.TEXT, allowNull: false },
      previous_hash: { type: DataTypes.CHAR(64), allowNull: false },
      hash: { type: DataTypes.CHAR(64), allowNull: false },
    },
    { sequelize, modelName: 'AuditEvent', tableName: 'audit_events' },
  );
