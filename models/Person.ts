import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
} from 'sequelize'

import { idColumn } from './columns'
import { sequelize } from './sequelize'

/** Somebody with an account. `email` is kept in lower case; `passwordHash` is argon2id. */
export class Person extends Model<InferAttributes<Person>, InferCreationAttributes<Person>> {
  declare id: CreationOptional<string>
  declare email: string
  declare name: string
  declare passwordHash: string
  /** Sealed; there while the second factor is in use. */
  declare totpSecret: CreationOptional<string | null>
  /** Sealed; begun and not yet confirmed, perhaps to take the other's place. */
  declare totpPending: CreationOptional<string | null>
  declare totpConfirmedAt: CreationOptional<Date | null>
  /** The time step of the last code taken, so that none is taken twice. */
  declare totpLastStep: CreationOptional<number>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Person.init(
  {
    id: idColumn,
    email: { type: DataTypes.TEXT, allowNull: false, unique: true },
    name: { type: DataTypes.TEXT, allowNull: false },
    passwordHash: { type: DataTypes.TEXT, allowNull: false },
    totpSecret: DataTypes.TEXT,
    totpPending: DataTypes.TEXT,
    totpConfirmedAt: DataTypes.DATE,
    totpLastStep: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    createdAt: DataTypes.DATE,
    updatedAt: DataTypes.DATE,
  },
  {
    sequelize: sequelize(),
    modelName: 'Person',
    tableName: 'people',
    defaultScope: { attributes: { exclude: ['passwordHash', 'totpSecret', 'totpPending'] } },
  },
)
