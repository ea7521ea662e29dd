import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
} from 'sequelize'

import { idColumn } from './columns'
import type { Person } from './Person'
import { sequelize } from './sequelize'

/** What the link of a letter to a person proves, once. */
export class AccountToken extends Model<
  InferAttributes<AccountToken>,
  InferCreationAttributes<AccountToken>
> {
  declare id: CreationOptional<string>
  declare personId: string
  declare kind: 'reset-password' | 'change-email'
  /** SHA-256 of the token in the letter, in hexadecimal. */
  declare tokenHash: string
  declare newEmail: CreationOptional<string | null>
  declare expiresAt: Date
  declare usedAt: CreationOptional<Date | null>
  declare createdAt: CreationOptional<Date>
  declare person?: NonAttribute<Person>
}

AccountToken.init(
  {
    id: idColumn,
    personId: { type: DataTypes.UUID, allowNull: false },
    kind: { type: DataTypes.TEXT, allowNull: false },
    tokenHash: { type: DataTypes.TEXT, allowNull: false },
    newEmail: DataTypes.TEXT,
    expiresAt: { type: DataTypes.DATE, allowNull: false },
    usedAt: DataTypes.DATE,
    createdAt: DataTypes.DATE,
  },
  {
    sequelize: sequelize(),
    modelName: 'AccountToken',
    tableName: 'account_tokens',
    updatedAt: false,
  },
)
