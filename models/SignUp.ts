import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import { idColumn } from './columns'
import { sequelize } from './sequelize'

/** An account and a brand that are asked for, and made once the link in the letter is confirmed. */
export class SignUp extends Model<InferAttributes<SignUp>, InferCreationAttributes<SignUp>> {
  declare id: CreationOptional<string>
  declare email: string
  declare name: string
  declare brandName: string
  declare passwordHash: string
  /** SHA-256 of the token in the letter, in hexadecimal. */
  declare tokenHash: string
  declare expiresAt: Date
  declare createdAt: CreationOptional<Date>
}

SignUp.init(
  {
    id: idColumn,
    email: { type: DataTypes.TEXT, allowNull: false },
    name: { type: DataTypes.TEXT, allowNull: false },
    brandName: { type: DataTypes.TEXT, allowNull: false },
    passwordHash: { type: DataTypes.TEXT, allowNull: false },
    tokenHash: { type: DataTypes.TEXT, allowNull: false },
    expiresAt: { type: DataTypes.DATE, allowNull: false },
    createdAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'SignUp', tableName: 'sign_ups', updatedAt: false },
)
