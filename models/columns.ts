import { DataTypes } from 'sequelize'

/** A uuid primary key. */
export const idColumn = {
  type: DataTypes.UUID,
  primaryKey: true,
  defaultValue: DataTypes.UUIDV4,
} as const

/** Counts the saves of a row; compared and raised by `updateVersioned`, never set by hand. */
export const versionColumn = {
  type: DataTypes.INTEGER,
  allowNull: false,
  defaultValue: 1,
} as const
