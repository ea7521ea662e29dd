import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
} from 'sequelize'

import type { Role } from '@/lib/people/constants'

import { idColumn } from './columns'
import type { Person } from './Person'
import { sequelize } from './sequelize'

/** An offer of a place in a brand, sent to an e-mail address. */
export class Invitation extends Model<
  InferAttributes<Invitation>,
  InferCreationAttributes<Invitation>
> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare email: string
  declare role: Role
  /** SHA-256 of the token in the letter, in hexadecimal. */
  declare tokenHash: string
  declare invitedById: string | null
  declare expiresAt: Date
  declare acceptedAt: CreationOptional<Date | null>
  declare withdrawnAt: CreationOptional<Date | null>
  declare requestKey: CreationOptional<string | null>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
  declare invitedBy?: NonAttribute<Person>
}

Invitation.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    email: { type: DataTypes.TEXT, allowNull: false },
    role: { type: DataTypes.TEXT, allowNull: false },
    tokenHash: { type: DataTypes.TEXT, allowNull: false },
    invitedById: DataTypes.UUID,
    expiresAt: { type: DataTypes.DATE, allowNull: false },
    acceptedAt: DataTypes.DATE,
    withdrawnAt: DataTypes.DATE,
    requestKey: DataTypes.UUID,
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'Invitation', tableName: 'invitations' },
)
