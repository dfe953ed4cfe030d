import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize'
import { idColumn, idKey, instantColumn } from './columns'

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
      id: idKey(),
      shopId: idColumn,
      name: DataTypes.STRING(80),
      createdAt: instantColumn,
      updatedAt: instantColumn,
    },
    { sequelize, modelName: 'Crew', tableName: 'crews' },
  )
}
