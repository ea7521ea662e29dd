import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type NonAttribute,
} from 'sequelize'

import { idColumn } from './columns'
import type { Person } from './Person'
import { sequelize } from './sequelize'

/** A signed-in browser. The cookie only names this row; ending the row ends the session. */
export class Session extends Model<InferAttributes<Session>, InferCreationAttributes<Session>> {
  declare id: CreationOptional<string>
  declare personId: string
  declare expiresAt: Date
  declare lastSeenAt: CreationOptional<Date>
  /** As the browser named itself, and from where it signed in. */
  declare userAgent: CreationOptional<string>
  declare address: CreationOptional<string>
  declare createdAt: CreationOptional<Date>
  declare person?: NonAttribute<Person>
}

Session.init(
  {
    id: idColumn,
    personId: { type: DataTypes.UUID, allowNull: false },
    expiresAt: { type: DataTypes.DATE, allowNull: false },
    lastSeenAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
    userAgent: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    address: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    createdAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'Session', tableName: 'sessions', updatedAt: false },
)
