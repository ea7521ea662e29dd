import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import { idColumn } from './columns'
import { sequelize } from './sequelize'

/** A picture of a kit, and where its bytes lie within the zip, which stores it as it is. */
export interface KitPicture {
  width: number
  height: number
  offset: number
  byteLength: number
}

/** A combination that a kit holds, as it was called when the kit was built, with its texts. */
export interface KitEntry {
  id: string
  title: string
  alt: string
  caption: string
  html: string
  pictures: KitPicture[]
}

/** A combination that was asked for and is not in the kit, with the reasons in words. */
export interface KitLeftOut {
  id: string
  title: string
  reasons: string[]
}

/** A kit: finished pictures and texts of combinations, built by a job into one zip. */
export class Kit extends Model<InferAttributes<Kit>, InferCreationAttributes<Kit>> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare lineId: string
  declare state: CreationOptional<'waiting' | 'building' | 'ready' | 'failed'>
  /** How many of `total` steps are done. */
  declare done: CreationOptional<number>
  declare total: CreationOptional<number>
  /** Ids of the combinations asked for, in order. */
  declare selection: string[]
  declare contents: CreationOptional<KitEntry[]>
  declare leftOut: CreationOptional<KitLeftOut[]>
  /** Where the zip lies; null before it is built and once it has expired. */
  declare objectKey: CreationOptional<string | null>
  declare byteLength: CreationOptional<number | null>
  declare sha256: CreationOptional<string | null>
  /** Why it could not be built, in words. */
  declare failure: CreationOptional<string | null>
  declare createdById: string | null
  declare requestKey: CreationOptional<string | null>
  /** When the zip is removed. */
  declare expiresAt: CreationOptional<Date | null>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Kit.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    lineId: { type: DataTypes.UUID, allowNull: false },
    state: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'waiting' },
    done: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    total: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    selection: { type: DataTypes.JSONB, allowNull: false },
    contents: { type: DataTypes.JSONB, allowNull: false, defaultValue: [] },
    leftOut: { type: DataTypes.JSONB, allowNull: false, defaultValue: [] },
    objectKey: { type: DataTypes.TEXT },
    byteLength: { type: DataTypes.INTEGER },
    sha256: { type: DataTypes.TEXT },
    failure: { type: DataTypes.TEXT },
    createdById: { type: DataTypes.UUID },
    requestKey: { type: DataTypes.UUID },
    expiresAt: { type: DataTypes.DATE },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'Kit', tableName: 'kits' },
)
