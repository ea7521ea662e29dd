import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import type { SearchOutcome } from '@/lib/names/constants'

import { idColumn } from './columns'
import { sequelize } from './sequelize'

/** Who searched which register of marks for an idea, and when. */
export class NameSearch extends Model<
  InferAttributes<NameSearch>,
  InferCreationAttributes<NameSearch>
> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare ideaId: string
  declare register: string
  declare searchedBy: string
  /** yyyy-mm-dd */
  declare searchedOn: string
  declare outcome: SearchOutcome
  declare note: CreationOptional<string>
  declare recordedById: string | null
  declare requestKey: CreationOptional<string | null>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

NameSearch.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    ideaId: { type: DataTypes.UUID, allowNull: false },
    register: { type: DataTypes.TEXT, allowNull: false },
    searchedBy: { type: DataTypes.TEXT, allowNull: false },
    searchedOn: { type: DataTypes.DATEONLY, allowNull: false },
    outcome: { type: DataTypes.TEXT, allowNull: false },
    note: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    recordedById: { type: DataTypes.UUID },
    requestKey: { type: DataTypes.UUID },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'NameSearch', tableName: 'name_searches' },
)
