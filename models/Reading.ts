import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import type { PhotographCell } from '@/lib/color/photograph-colors'
import type { StrikingColor } from '@/lib/color/striking'

import { idColumn } from './columns'
import { sequelize } from './sequelize'

/** What was read from a photograph: its colours, and the line's shades that are it. */
export class Reading extends Model<InferAttributes<Reading>, InferCreationAttributes<Reading>> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare photographId: string
  /** Lab D65 cells with their area shares. */
  declare cells: PhotographCell[]
  /** Deflated bytes, one a pixel of `mapWidth` × `mapHeight`: the pixel's cell, 255 for none. */
  declare cellMap: Buffer
  declare mapWidth: number
  declare mapHeight: number
  declare striking: StrikingColor[]
  /** The stored matches of the five readings, as presented by lib/photographs. */
  declare matches: unknown
  /** `Line.shadesRevision` that the matches saw. */
  declare shadesRevision: number
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Reading.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    photographId: { type: DataTypes.UUID, allowNull: false, unique: true },
    cells: { type: DataTypes.JSONB, allowNull: false },
    cellMap: { type: DataTypes.BLOB, allowNull: false },
    mapWidth: { type: DataTypes.INTEGER, allowNull: false },
    mapHeight: { type: DataTypes.INTEGER, allowNull: false },
    striking: { type: DataTypes.JSONB, allowNull: false },
    matches: { type: DataTypes.JSONB, allowNull: false },
    shadesRevision: { type: DataTypes.INTEGER, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'Reading', tableName: 'readings' },
)
