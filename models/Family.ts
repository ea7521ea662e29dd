import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import { idColumn } from './columns'
import { sequelize } from './sequelize'

/** A tonal family of a line: shades that stand together in the sample book. */
export class Family extends Model<InferAttributes<Family>, InferCreationAttributes<Family>> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare lineId: string
  declare name: string
  /** Somebody named it; computing anew keeps the name. */
  declare nameGiven: CreationOptional<boolean>
  /** The family of shades with too little chroma to have a hue. */
  declare neutral: CreationOptional<boolean>
  /** Place in the sample book, from 0. */
  declare position: number
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Family.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    lineId: { type: DataTypes.UUID, allowNull: false },
    name: { type: DataTypes.TEXT, allowNull: false },
    nameGiven: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    neutral: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    position: { type: DataTypes.INTEGER, allowNull: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'Family', tableName: 'families' },
)
