import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import { idColumn } from './columns'
import { sequelize } from './sequelize'

/** A code that stands in, once, for the second factor of somebody who has lost it. */
export class RecoveryCode extends Model<
  InferAttributes<RecoveryCode>,
  InferCreationAttributes<RecoveryCode>
> {
  declare id: CreationOptional<string>
  declare personId: string
  /** SHA-256 of the code, in hexadecimal. */
  declare codeHash: string
  declare usedAt: CreationOptional<Date | null>
  declare createdAt: CreationOptional<Date>
}

RecoveryCode.init(
  {
    id: idColumn,
    personId: { type: DataTypes.UUID, allowNull: false },
    codeHash: { type: DataTypes.TEXT, allowNull: false },
    usedAt: DataTypes.DATE,
    createdAt: DataTypes.DATE,
  },
  {
    sequelize: sequelize(),
    modelName: 'RecoveryCode',
    tableName: 'recovery_codes',
    updatedAt: false,
  },
)
