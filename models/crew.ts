import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize'
import { idColumn, instantColumn } from './columns'
import { uuidv7 } from './uuid'

/** Instructors and their apprentices. */
export class Crew extends Model<InferAttributes<Crew>, InferCreationAttributes<Crew>> {
  declare id: CreationOptional<string>
  declare shopId: string
  declare name: string
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

export function defineCrew(sequelize: Sequelize) {
  Crew.init(
    {
      id: { type: idColumn, primaryKey: true, defaultValue: () => uuidv7() },
      shopId: idColumn,
      name: DataTypes.STRING(80),
      createdAt: instantColumn,
      updatedAt: instantColumn,
    },
    { sequelize, modelName: 'Crew', tableName: 'crews' },
  )
}
