import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import { idColumn } from './columns'
import { sequelize } from './sequelize'

/**
 * A letter to be sent, or sent. Its body may hold a link that proves something, so it is kept
 * sealed and emptied once the mail server has taken it.
 */
export class Letter extends Model<InferAttributes<Letter>, InferCreationAttributes<Letter>> {
  declare id: CreationOptional<string>
  declare kind: string
  declare recipient: string
  declare subject: string
  declare sealedBody: string
  declare createdAt: CreationOptional<Date>
  declare sentAt: CreationOptional<Date | null>
  declare failedAt: CreationOptional<Date | null>
  declare failure: CreationOptional<string | null>
}

Letter.init(
  {
    id: idColumn,
    kind: { type: DataTypes.TEXT, allowNull: false },
    recipient: { type: DataTypes.TEXT, allowNull: false },
    subject: { type: DataTypes.TEXT, allowNull: false },
    sealedBody: { type: DataTypes.TEXT, allowNull: false },
    createdAt: DataTypes.DATE,
    sentAt: DataTypes.DATE,
    failedAt: DataTypes.DATE,
    failure: DataTypes.TEXT,
  },
  { sequelize: sequelize(), modelName: 'Letter', tableName: 'letters', updatedAt: false },
)
