import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize'
import { instantColumn } from './columns'

/** The answer a creating call was given, for when the same call comes again. */
export class IdempotencyKey extends Model<InferAttributes<IdempotencyKey>, InferCreationAttributes<IdempotencyKey>> {
  /** The user's id, or `anyone`. */
  declare owner: string
  declare key: string
  declare requestHash: string
  declare status: number
  declare answer: CreationOptional<object | null>
  declare createdAt: CreationOptional<Date>
}

export function defineIdempotencyKey(sequelize: Sequelize) {
  IdempotencyKey.init(
    {
      owner: { type: DataTypes.STRING(36), primaryKey: true },
      key: { type: DataTypes.STRING(100), primaryKey: true },
      requestHash: DataTypes.CHAR(64),
      status: DataTypes.INTEGER,
      answer: DataTypes.JSON,
      createdAt: instantColumn,
    },
    { sequelize, modelName: 'IdempotencyKey', tableName: 'idempotency_keys', updatedAt: false },
  )
}
