import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import type { ShadeStatus } from '@/lib/shades/constants'

import { idColumn, versionColumn } from './columns'
import { sequelize } from './sequelize'

/** One shade of a line. Lab is under D65; `observer` says which standard observer read it. */
export class Shade extends Model<InferAttributes<Shade>, InferCreationAttributes<Shade>> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare lineId: string
  declare number: string
  declare name: CreationOptional<string | null>
  declare labL: number
  declare labA: number
  declare labB: number
  declare illuminant: 'D65'
  declare observer: 2 | 10
  /** The sRGB hex it was entered as, when it was; otherwise null and Lab is the record. */
  declare hex: CreationOptional<string | null>
  declare status: ShadeStatus
  /** Place in the line's own order, from 0. */
  declare position: number
  /** Its tonal family; null while it is in none. */
  declare familyId: CreationOptional<string | null>
  /** Somebody put it there: computing the families anew leaves it. */
  declare familyPinned: CreationOptional<boolean>
  /** Place in its family where somebody ordered it; null stands by lightness. */
  declare familyPosition: CreationOptional<number | null>
  declare requestKey: CreationOptional<string | null>
  declare version: CreationOptional<number>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
  declare deletedAt: CreationOptional<Date | null>
}

Shade.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    lineId: { type: DataTypes.UUID, allowNull: false },
    number: { type: DataTypes.TEXT, allowNull: false },
    name: { type: DataTypes.TEXT },
    labL: { type: DataTypes.DOUBLE, allowNull: false },
    labA: { type: DataTypes.DOUBLE, allowNull: false },
    labB: { type: DataTypes.DOUBLE, allowNull: false },
    illuminant: { type: DataTypes.TEXT, allowNull: false },
    observer: { type: DataTypes.INTEGER, allowNull: false },
    hex: { type: DataTypes.TEXT },
    status: { type: DataTypes.TEXT, allowNull: false },
    position: { type: DataTypes.INTEGER, allowNull: false },
    familyId: { type: DataTypes.UUID },
    familyPinned: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    familyPosition: { type: DataTypes.INTEGER },
    requestKey: { type: DataTypes.UUID },
    version: versionColumn,
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
    deletedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'Shade', tableName: 'shades', paranoid: true },
)
