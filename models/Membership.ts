import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
} from 'sequelize'

import type { Role } from '@/lib/people/constants'

import type { Brand } from './Brand'
import { idColumn } from './columns'
import type { Person } from './Person'
import { sequelize } from './sequelize'

/** A person's place in a brand. */
export class Membership extends Model<
  InferAttributes<Membership>,
  InferCreationAttributes<Membership>
> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare personId: string
  declare role: Role
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
  declare brand?: NonAttribute<Brand>
  declare person?: NonAttribute<Person>
}

Membership.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    personId: { type: DataTypes.UUID, allowNull: false },
    role: { type: DataTypes.TEXT, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'Membership', tableName: 'memberships' },
)
