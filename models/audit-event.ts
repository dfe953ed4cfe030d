import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize'
import { idColumn, idKey, instantColumn } from './columns'

/** Who did what to which row, and when. Added to, never changed. */
export class AuditEvent extends Model<InferAttributes<AuditEvent>, InferCreationAttributes<AuditEvent>> {
  declare id: CreationOptional<string>
  declare shopId: string
  declare actorId: string
  /** Noun and verb, as `job.created`. */
  declare action: string
  declare subjectId: string
  declare details: { [name: string]: unknown }
  declare at: Date
}

export function defineAuditEvent(sequelize: Sequelize) {
  AuditEvent.init(
    {
      id: idKey(),
      shopId: idColumn,
      actorId: idColumn,
      action: DataTypes.STRING(60),
      subjectId: idColumn,
      details: DataTypes.JSON,
      at: instantColumn,
    },
    { sequelize, modelName: 'AuditEvent', tableName: 'audit_events', timestamps: false },
  )
}
