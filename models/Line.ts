import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import type { Fibre } from '@/lib/lines/schema'

import { idColumn, versionColumn } from './columns'
import { sequelize } from './sequelize'

/** A line: one base yarn, dyed in many shades. */
export class Line extends Model<InferAttributes<Line>, InferCreationAttributes<Line>> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare slug: string
  declare name: string
  declare fibres: Fibre[]
  declare ply: number
  /** Standard yarn weight number, 0 (lace) to 7 (jumbo). */
  declare weightNumber: number
  /** Net weight of one ball, grams. */
  declare netGrams: number
  /** Length of one ball in `lengthUnit`, as entered. */
  declare length: number
  declare lengthUnit: 'm' | 'yd'
  /** Needle, millimetres. */
  declare needleMm: number
  /** Stitches over 10 cm. */
  declare gaugeStitches: number
  /** Rows over 10 cm. */
  declare gaugeRows: number
  /** ISO 4217. */
  declare currency: string
  /** Price of one ball in the currency's minor unit. */
  declare priceMinor: number
  /** yyyy-mm-dd, or null while undecided. */
  declare launchDate: CreationOptional<string | null>
  /** Goes up with every change to the line's shades; a stored match remembers the one it saw. */
  declare shadesRevision: CreationOptional<number>
  /** Goes up with every change to the line's families: what an edit of them says it saw. */
  declare familiesVersion: CreationOptional<number>
  /** How many families were asked for; null leaves it to the computation. */
  declare familyCount: CreationOptional<number | null>
  /** Goes up with every change to the line's combinations. */
  declare boardRevision: CreationOptional<number>
  declare requestKey: CreationOptional<string | null>
  declare version: CreationOptional<number>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Line.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    slug: { type: DataTypes.TEXT, allowNull: false },
    name: { type: DataTypes.TEXT, allowNull: false },
    fibres: { type: DataTypes.JSONB, allowNull: false },
    ply: { type: DataTypes.INTEGER, allowNull: false },
    weightNumber: { type: DataTypes.INTEGER, allowNull: false },
    netGrams: { type: DataTypes.DOUBLE, allowNull: false },
    length: { type: DataTypes.DOUBLE, allowNull: false },
    lengthUnit: { type: DataTypes.TEXT, allowNull: false },
    needleMm: { type: DataTypes.DOUBLE, allowNull: false },
    gaugeStitches: { type: DataTypes.DOUBLE, allowNull: false },
    gaugeRows: { type: DataTypes.DOUBLE, allowNull: false },
    currency: { type: DataTypes.TEXT, allowNull: false },
    priceMinor: { type: DataTypes.INTEGER, allowNull: false },
    launchDate: { type: DataTypes.DATEONLY },
    shadesRevision: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    familiesVersion: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    familyCount: { type: DataTypes.INTEGER },
    boardRevision: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    requestKey: { type: DataTypes.UUID },
    version: versionColumn,
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'Line', tableName: 'lines' },
)
