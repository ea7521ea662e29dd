import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
} from 'sequelize'

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
  declare shadeId: string
  /** Share of the combination, 0 to 1; the five sum to 1. */
  declare share: number
  declare shade?: NonAttribute<Shade>
}

CombinationPlace.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    combinationId: { type: DataTypes.UUID, allowNull: false },
    place: { type: DataTypes.INTEGER, allowNull: false },
    shadeId: { type: DataTypes.UUID, allowNull: false },
    share: { type: DataTypes.DOUBLE, allowNull: false },
  },
  {
    sequelize: sequelize(),
    modelName: 'CombinationPlace',
    tableName: 'combination_places',
    timestamps: false,
  },
)
