import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import type { NameVoteKind } from '@/lib/names/constants'

import { idColumn } from './columns'
import { sequelize } from './sequelize'

/** What a reviewer thinks of an idea, in the round it was sent for. */
export class NameVote extends Model<InferAttributes<NameVote>, InferCreationAttributes<NameVote>> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare ideaId: string
  declare round: number
  declare personId: string
  declare vote: NameVoteKind
  declare comment: CreationOptional<string>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

NameVote.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    ideaId: { type: DataTypes.UUID, allowNull: false },
    round: { type: DataTypes.INTEGER, allowNull: false },
    personId: { type: DataTypes.UUID, allowNull: false },
    vote: { type: DataTypes.TEXT, allowNull: false },
    comment: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'NameVote', tableName: 'name_votes' },
)
