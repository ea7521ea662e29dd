import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import { idColumn, versionColumn } from './columns'
import { sequelize } from './sequelize'

/** How the names of a line are set and dated; a line without a row has the defaults. */
export class NamingSettings extends Model<
  InferAttributes<NamingSettings>,
  InferCreationAttributes<NamingSettings>
> {
  declare id: CreationOptional<string>
  declare brandId: string
  declare lineId: string
  /** Of the ball band, mm. */
  declare labelWidth: number
  /** Of the letters, pt. */
  declare labelSize: number
  declare labelLines: 1 | 2
  /** Care in words, as it stands on the band. */
  declare care: CreationOptional<string>
  /** Words of the world the line tells of. */
  declare themes: CreationOptional<string[]>
  /** yyyy-mm-dd: when the label printer begins; approved names are locked from that day on. */
  declare printOn: CreationOptional<string | null>
  /** When they were locked; null while they are not, or that day has not been noted yet. */
  declare frozenAt: CreationOptional<Date | null>
  declare version: CreationOptional<number>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

NamingSettings.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    lineId: { type: DataTypes.UUID, allowNull: false },
    labelWidth: { type: DataTypes.DOUBLE, allowNull: false },
    labelSize: { type: DataTypes.DOUBLE, allowNull: false },
    labelLines: { type: DataTypes.INTEGER, allowNull: false },
    care: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    themes: { type: DataTypes.JSONB, allowNull: false, defaultValue: [] },
    printOn: { type: DataTypes.DATEONLY },
    frozenAt: { type: DataTypes.DATE },
    version: versionColumn,
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'NamingSettings', tableName: 'naming_settings' },
)
