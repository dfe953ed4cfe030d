import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize'
import { idKey, instantColumn } from './columns'

/** A letter to be mailed, written in the transaction that causes it, so that neither is lost without the other. */
export class OutboxLetter extends Model<InferAttributes<OutboxLetter>, InferCreationAttributes<OutboxLetter>> {
  /** Also the local part of its Message-ID, so that a letter sent twice is known as one. */
  declare id: CreationOptional<string>
  declare kind: string
  declare recipient: string
  declare payload: { [name: string]: unknown }
  declare attempts: CreationOptional<number>
  /** Not before this instant is it tried (again). */
  declare dueAt: Date
  declare sentAt: CreationOptional<Date | null>
  declare givenUpAt: CreationOptional<Date | null>
  declare createdAt: CreationOptional<Date>
}

export function defineOutboxLetter(sequelize: Sequelize) {
  OutboxLetter.init(
    {
      id: idKey(),
      kind: DataTypes.STRING(40),
      recipient: DataTypes.STRING(254),
      payload: DataTypes.JSON,
      attempts: DataTypes.INTEGER,
      dueAt: instantColumn,
      sentAt: instantColumn,
      givenUpAt: instantColumn,
      createdAt: instantColumn,
    },
    { sequelize, modelName: 'OutboxLetter', tableName: 'outbox', updatedAt: false },
  )
}
