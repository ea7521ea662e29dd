import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
} from 'sequelize'

import type { PlaceRole } from '@/lib/combinations/constants'

import { idColumn } from './columns'
import { sequelize } from './sequelize'
import type { Shade } from './Shade'

/** One of the five places of a combination. */
export class CombinationPlace extends Model<
  InferAttributes<CombinationPlace>,
  InferCreationAttributes<CombinationPlace>
> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare combinationId: string
  /** 1 to 5, top to bottom of the wrap card. */
  declare place: number
  /** Null where the place is still empty. */
  declare shadeId: string | null
  /** Share of the combination, 0 to 1; the five sum to 1. */
  declare share: number
  /** What it is called in a pattern; the five are different. */
  declare role: PlaceRole
  /** Whoever completes or swaps leaves it. */
  declare locked: CreationOptional<boolean>
  declare shade?: NonAttribute<Shade | null>
}

CombinationPlace.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    combinationId: { type: DataTypes.UUID, allowNull: false },
    place: { type: DataTypes.INTEGER, allowNull: false },
    shadeId: { type: DataTypes.UUID },
    role: { type: DataTypes.TEXT, allowNull: false },
    locked: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    share: { type: DataTypes.DOUBLE, allowNull: false },
  },
  {
    sequelize: sequelize(),
    modelName: 'CombinationPlace',
    tableName: 'combination_places',
    timestamps: false,
  },
)
