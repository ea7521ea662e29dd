import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import type { NameState } from '@/lib/names/constants'
import type { Finding } from '@/lib/naming/finding'

import { idColumn, versionColumn } from './columns'
import { sequelize } from './sequelize'

/** An idea for a shade’s name; without a shade it lies in the heap. */
export class NameIdea extends Model<InferAttributes<NameIdea>, InferCreationAttributes<NameIdea>> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare lineId: string
  declare shadeId: CreationOptional<string | null>
  declare text: string
  /** The thought behind it; may be empty. */
  declare note: CreationOptional<string>
  declare state: NameState
  declare stateSince: CreationOptional<Date>
  /** How often it has been sent for review: votes belong to a round. */
  declare round: CreationOptional<number>
  /** Who brought it; null once that account is gone. */
  declare authorId: string | null
  /** Whose words they are now. */
  declare wordedById: string | null
  /** What the checks found when it was sent for review; null before. */
  declare findings: CreationOptional<Finding[] | null>
  declare checkedAt: CreationOptional<Date | null>
  /** Why it stands although its wording was warned of. */
  declare wordingReason: CreationOptional<string>
  /** An approved name that may change although names are locked. */
  declare unlockedAt: CreationOptional<Date | null>
  declare requestKey: CreationOptional<string | null>
  declare version: CreationOptional<number>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
  declare deletedAt: CreationOptional<Date | null>
}

NameIdea.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    lineId: { type: DataTypes.UUID, allowNull: false },
    shadeId: { type: DataTypes.UUID },
    text: { type: DataTypes.TEXT, allowNull: false },
    note: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    state: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'draft' },
    stateSince: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    round: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    authorId: { type: DataTypes.UUID },
    wordedById: { type: DataTypes.UUID },
    findings: { type: DataTypes.JSONB },
    checkedAt: { type: DataTypes.DATE },
    wordingReason: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    unlockedAt: { type: DataTypes.DATE },
    requestKey: { type: DataTypes.UUID },
    version: versionColumn,
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
    deletedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'NameIdea', tableName: 'name_ideas', paranoid: true },
)
