import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import { idColumn } from './columns'
import { sequelize } from './sequelize'

/** Somebody who decides on the names of a line besides the owners. */
export class NameReviewer extends Model<
  InferAttributes<NameReviewer>,
  InferCreationAttributes<NameReviewer>
> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare lineId: string
  declare personId: string
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

NameReviewer.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    lineId: { type: DataTypes.UUID, allowNull: false },
    personId: { type: DataTypes.UUID, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'NameReviewer', tableName: 'name_reviewers' },
)
