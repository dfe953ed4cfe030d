import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize'
import type { SheetAnswer } from '@/lib/schemas/views'
import { idColumn, idKey, instantColumn } from './columns'

/** One revision of one cut sheet. Rows are added, never rewritten: an older one is only marked superseded. */
export class CutSheet extends Model<InferAttributes<CutSheet>, InferCreationAttributes<CutSheet>> {
  declare id: CreationOptional<string>
  declare jobId: string
  /** Its number in the job, from 1. */
  declare sheet: number
  declare revision: number
  declare name: string
  declare calculator: string
  declare calculatorRevision: number
  declare inputs: { [name: string]: unknown }
  declare results: SheetAnswer
  declare measuredBy: string
  /** YYYY-MM-DD */
  declare measuredOn: string
  declare instrument: string
  declare note: string
  declare createdBy: string
  declare createdAt: CreationOptional<Date>
  declare supersededAt: CreationOptional<Date | null>
}

export function defineCutSheet(sequelize: Sequelize) {
  CutSheet.init(
    {
      id: idKey(),
      jobId: idColumn,
      sheet: DataTypes.INTEGER,
      revision: DataTypes.INTEGER,
      name: DataTypes.STRING(80),
      calculator: DataTypes.STRING(60),
      calculatorRevision: DataTypes.INTEGER,
      inputs: DataTypes.JSON,
      results: DataTypes.JSON,
      measuredBy: DataTypes.STRING(80),
      measuredOn: DataTypes.DATEONLY,
      instrument: DataTypes.STRING(120),
      note: DataTypes.STRING(500),
      createdBy: idColumn,
      createdAt: instantColumn,
      supersededAt: instantColumn,
    },
    { sequelize, modelName: 'CutSheet', tableName: 'cut_sheets', updatedAt: false },
  )
}
