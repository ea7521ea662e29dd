import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
} from 'sequelize'

import type { Derivative, Licence, PhotographState } from '@/lib/photographs/constants'

import { idColumn, versionColumn } from './columns'
import type { Reading } from './Reading'
import { sequelize } from './sequelize'

/** An inspiration photograph of a line. The original is at `objectKey` in the object store. */
export class Photograph extends Model<
  InferAttributes<Photograph>,
  InferCreationAttributes<Photograph>
> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare lineId: string
  declare title: string
  declare photographer: CreationOptional<string>
  declare licence: CreationOptional<Licence | null>
  declare licenceNote: CreationOptional<string>
  declare licenceUrl: CreationOptional<string>
  declare sourceUrl: CreationOptional<string>
  declare altText: CreationOptional<string>
  declare fileName: string
  declare objectKey: string
  declare contentType: string
  declare byteLength: number
  /** Hex SHA-256 of the original. */
  declare sha256: string
  /** Pixels after orientation; null until read. */
  declare width: CreationOptional<number | null>
  declare height: CreationOptional<number | null>
  /** The copies that are in the object store, WebP before AVIF, narrow before wide. */
  declare derivatives: CreationOptional<Derivative[]>
  declare state: CreationOptional<PhotographState>
  /** Why the reading failed, in words for the person who uploaded. */
  declare failure: CreationOptional<string | null>
  declare uploadedById: string | null
  declare version: CreationOptional<number>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
  declare deletedAt: CreationOptional<Date | null>
  declare reading?: NonAttribute<Reading | null>
}

Photograph.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    lineId: { type: DataTypes.UUID, allowNull: false },
    title: { type: DataTypes.TEXT, allowNull: false },
    photographer: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    licence: { type: DataTypes.TEXT },
    licenceNote: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    licenceUrl: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    sourceUrl: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    altText: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    fileName: { type: DataTypes.TEXT, allowNull: false },
    objectKey: { type: DataTypes.TEXT, allowNull: false },
    contentType: { type: DataTypes.TEXT, allowNull: false },
    byteLength: { type: DataTypes.INTEGER, allowNull: false },
    sha256: { type: DataTypes.TEXT, allowNull: false },
    width: { type: DataTypes.INTEGER },
    height: { type: DataTypes.INTEGER },
    derivatives: { type: DataTypes.JSONB, allowNull: false, defaultValue: [] },
    state: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'pending' },
    failure: { type: DataTypes.TEXT },
    uploadedById: { type: DataTypes.UUID },
    version: versionColumn,
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
    deletedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'Photograph', tableName: 'photographs', paranoid: true },
)
