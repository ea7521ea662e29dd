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

/** Something that was done, or refused, in a brand. Rows are added and never changed. */
export class Activity extends Model<InferAttributes<Activity>, InferCreationAttributes<Activity>> {
  declare id: CreationOptional<string>
  declare brandId: string
  /** Null once the account is closed. */
  declare personId: string | null
  declare action: string
  declare objectKind: CreationOptional<string | null>
  declare objectId: CreationOptional<string | null>
  declare objectLabel: CreationOptional<string | null>
  declare before: CreationOptional<Record<string, unknown> | null>
  declare after: CreationOptional<Record<string, unknown> | null>
  declare requestId: CreationOptional<string | null>
  declare createdAt: CreationOptional<Date>
  declare person?: NonAttribute<Person>
}

Activity.init(
  {
    id: idColumn,
    brandId: { type: DataTypes.UUID, allowNull: false },
    personId: DataTypes.UUID,
    action: { type: DataTypes.TEXT, allowNull: false },
    objectKind: DataTypes.TEXT,
    objectId: DataTypes.UUID,
    objectLabel: DataTypes.TEXT,
    before: DataTypes.JSONB,
    after: DataTypes.JSONB,
    requestId: DataTypes.UUID,
    createdAt: DataTypes.DATE,
  },
  { sequelize: sequelize(), modelName: 'Activity', tableName: 'activities', updatedAt: false },
)
