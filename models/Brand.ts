import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import { idColumn } from './columns'
import { sequelize } from './sequelize'

/** A yarn brand: the tenant. Every row of the studio belongs to exactly one. */
export class Brand extends Model<InferAttributes<Brand>, InferCreationAttributes<Brand>> {
  declare id: CreationOptional<string>
  declare name: string
  declare slug: string
  /** Its members must sign in with a second factor. */
  declare secondFactorRequired: CreationOptional<boolean>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Brand.init(
  {
    id: idColumn,
    name: { type: DataTypes.TEXT, allowNull: false },
    slug: { type: DataTypes.TEXT, allowNull: false, unique: true },
    secondFactorRequired: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'Brand', tableName: 'brands' },
)
