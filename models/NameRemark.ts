import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import { idColumn } from './columns'
import { sequelize } from './sequelize'

/** A remark in the talk about an idea. */
export class NameRemark extends Model<
  InferAttributes<NameRemark>,
  InferCreationAttributes<NameRemark>
> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare ideaId: string
  declare personId: string | null
  declare text: string
  declare requestKey: CreationOptional<string | null>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

NameRemark.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    ideaId: { type: DataTypes.UUID, allowNull: false },
    personId: { type: DataTypes.UUID },
    text: { type: DataTypes.TEXT, allowNull: false },
    requestKey: { type: DataTypes.UUID },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'NameRemark', tableName: 'name_remarks' },
)
