import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';

/** `account` is a hash of the e-mail typed: people type passwords into the wrong field. */
export class SignInAttempt extends Model<
  InferAttributes<SignInAttempt>,
  InferCreationAttributes<SignInAttempt>
> {
  declare id: CreationOptional<string>;
  declare agency_id: string | null;
  declare account: string;
  declare address: string;
  declare outcome: 'trying' | 'failed' | 'refused' | 'signed-in';
  declare at: Date;
}

export const defineSignInAttempt = (sequelize: Sequelize) =>
  SignInAttempt.init(
    {
      id: { type: DataTypes.BIGINT.UNSIGNED, primaryKey: true, autoIncrement: true },
      agency_id: { type: DataTypes.CHAR(36) },
      account: { type: DataTypes.CHAR(64), allowNull: false },
      address: { type: DataTypes.STRING(64), allowNull: false },
      outcome: { type: DataTypes.STRING(10), allowNull: false },
      at: { type: DataTypes.DATE(3), allowNull: false },
    },
    { sequelize, modelName: 'SignInAttempt', tableName: 'sign_in_attempts' },
  );
