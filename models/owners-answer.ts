import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize';
import type { AnswerClass, SiteGround } from '@/lib/layout';

type OwnersAnswerDocument = NonNullable<SiteGround['answers'][AnswerClass]>;

export class OwnersAnswer extends Model<
  InferAttributes<OwnersAnswer>,
  InferCreationAttributes<OwnersAnswer>
> {
  declare site_id: string;
  declare class: AnswerClass;
  declare agency_id: string;
  declare answer: string;
  declare entry: OwnersAnswerDocument;
}

export const defineOwnersAnswer = (sequelize: Sequelize) =>
  OwnersAnswer.init(
    {
      site_id: { type: DataTypes.CHAR(36), primaryKey: true },
      class: { type: DataTypes.STRING(30), primaryKey: true },
      agency_id: { type: DataTypes.CHAR(36), allowNull: false },
      answer: { type: DataTypes.STRING(10), allowNull: false },
      entry: { type: DataTypes.JSON, allowNull: false },
    },
    { sequelize, modelName: 'OwnersAnswer', tableName: 'owners_answers' },
  );
