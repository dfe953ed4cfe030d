import { DataTypes } from 'sequelize'

/** The type of every id and of every column that points to one: a UUID as text. */
export const idColumn = DataTypes.CHAR(36)

/** An instant, UTC, to the millisecond. */
export const instantColumn = DataTypes.DATE(3)
