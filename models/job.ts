import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize'
import { idColumn, idKey, instantColumn } from './columns'

/** One job in a journeyman's book. */
export class Job extends Model<InferAttributes<Job>, InferCreationAttributes<Job>> {
  declare id: CreationOptional<string>
  declare shopId: string
  declare ownerId: string
  declare name: string
  declare place: string
  declare client: string
  declare notes: string
  declare archivedAt: CreationOptional<Date | null>
  /** Made by the database from `archivedAt`, so that lists can use an index. */
  declare readonly archived: CreationOptional<boolean>
  declare version: CreationOptional<number>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

export function defineJob(sequelize: Sequelize) {
  Job.init(
    {
      id: idKey(),
      shopId: idColumn,
      ownerId: idColumn,
      name: DataTypes.STRING(120),
      place: DataTypes.STRING(200),
      client: DataTypes.STRING(120),
      notes: DataTypes.TEXT,
      archivedAt: instantColumn,
      archived: DataTypes.BOOLEAN,
      version: DataTypes.INTEGER,
      createdAt: instantColumn,
      updatedAt: instantColumn,
    },
    { sequelize, modelName: 'Job', tableName: 'jobs' },
  )
}
