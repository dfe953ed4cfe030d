import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize'
import { idColumn, instantColumn } from './columns'

/** One person's place in one crew. */
export class CrewMember extends Model<InferAttributes<CrewMember>, InferCreationAttributes<CrewMember>> {
  declare crewId: string
  declare userId: string
  declare place: 'apprentice' | 'instructor'
  declare createdAt: CreationOptional<Date>
}

export function defineCrewMember(sequelize: Sequelize) {
  CrewMember.init(
    {
      crewId: { type: idColumn, primaryKey: true },
      userId: { type: idColumn, primaryKey: true },
      place: DataTypes.STRING(20),
      createdAt: instantColumn,
    },
    { sequelize, modelName: 'CrewMember', tableName: 'crew_members', updatedAt: false },
  )
}
