import { DataTypes } from 'sequelize'
import { uuidv7 } from './uuid'

/** The type of every id and of every column that points to one: a UUID as text. */
export const idColumn = DataTypes.CHAR(36)

/** An instant, UTC, to the millisecond. */
export const instantColumn = DataTypes.DATE(3)

/** A row's own id, made when the row is. A new object each time, as Sequelize writes into it. */
export const idKey = () => ({ type: idColumn, primaryKey: true, defaultValue: () => uuidv7() })
