import {
  DataTypes,
  literal,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
} from 'sequelize'

import type { NameMoveKind, NameState } from '@/lib/names/constants'

import { idColumn } from './columns'
import type { NameIdea } from './NameIdea'
import { sequelize } from './sequelize'

/** A move of an idea, kept for good: what it said then, who moved it, and why. */
export class NameMove extends Model<InferAttributes<NameMove>, InferCreationAttributes<NameMove>> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare lineId: string
  declare ideaId: string
  declare move: NameMoveKind
  declare fromState: CreationOptional<NameState | null>
  declare toState: NameState
  declare text: string
  declare shadeId: CreationOptional<string | null>
  declare reason: CreationOptional<string>
  declare round: number
  declare personId: string | null
  /** When the author was written to about it. */
  declare toldAt: CreationOptional<Date | null>
  declare createdAt: CreationOptional<Date>
  declare idea?: NonAttribute<NameIdea>
}

NameMove.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    lineId: { type: DataTypes.UUID, allowNull: false },
    ideaId: { type: DataTypes.UUID, allowNull: false },
    move: { type: DataTypes.TEXT, allowNull: false },
    fromState: { type: DataTypes.TEXT },
    toState: { type: DataTypes.TEXT, allowNull: false },
    text: { type: DataTypes.TEXT, allowNull: false },
    shadeId: { type: DataTypes.UUID },
    reason: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    round: { type: DataTypes.INTEGER, allowNull: false },
    personId: { type: DataTypes.UUID },
    toldAt: { type: DataTypes.DATE },
    // Of moves written together each has its own moment: the history tells them in their order.
    createdAt: { type: DataTypes.DATE, defaultValue: literal('clock_timestamp()') },
  },
  { sequelize: sequelize(), modelName: 'NameMove', tableName: 'name_moves', timestamps: false },
)
