import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
} from 'sequelize'

import type { ReadingKind } from '@/lib/color/match'
import type { Lane } from '@/lib/combinations/constants'

import type { CombinationPlace } from './CombinationPlace'
import { idColumn, versionColumn } from './columns'
import type { Photograph } from './Photograph'
import { sequelize } from './sequelize'

/** Five shades of a line put together and kept. */
export class Combination extends Model<
  InferAttributes<Combination>,
  InferCreationAttributes<Combination>
> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare lineId: string
  declare title: string
  declare photographId: CreationOptional<string | null>
  /** Which reading of the photograph it began as. */
  declare reading: CreationOptional<ReadingKind | null>
  /** Where it stands on the board. */
  declare lane: CreationOptional<Lane>
  /** Its place in the lane, by byte order. */
  declare rank: string
  /** What the five tell, in a few sentences; may be empty. */
  declare story: CreationOptional<string>
  declare createdById: string | null
  declare requestKey: CreationOptional<string | null>
  declare version: CreationOptional<number>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
  declare deletedAt: CreationOptional<Date | null>
  declare places?: NonAttribute<CombinationPlace[]>
  declare photograph?: NonAttribute<Photograph | null>
}

Combination.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    lineId: { type: DataTypes.UUID, allowNull: false },
    title: { type: DataTypes.TEXT, allowNull: false },
    photographId: { type: DataTypes.UUID },
    reading: { type: DataTypes.TEXT },
    lane: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'sketched' },
    rank: { type: DataTypes.TEXT, allowNull: false },
    story: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    createdById: { type: DataTypes.UUID },
    requestKey: { type: DataTypes.UUID },
    version: versionColumn,
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
    deletedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'Combination', tableName: 'combinations', paranoid: true },
)
