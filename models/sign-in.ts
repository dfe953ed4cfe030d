import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize'
import { idColumn, idKey, instantColumn } from './columns'

/** One session on one device. Ended rows stay, so that the list can show them go. */
export class SignIn extends Model<InferAttributes<SignIn>, InferCreationAttributes<SignIn>> {
  declare id: CreationOptional<string>
  declare userId: string
  declare startedAt: Date
  declare lastSeenAt: Date
  declare endedAt: CreationOptional<Date | null>
  /** What the browser calls itself, shortened. */
  declare agent: string
}

export function defineSignIn(sequelize: Sequelize) {
  SignIn.init(
    {
      id: idKey(),
      userId: idColumn,
      startedAt: instantColumn,
      lastSeenAt: instantColumn,
      endedAt: instantColumn,
      agent: DataTypes.STRING(200),
    },
    { sequelize, modelName: 'SignIn', tableName: 'sign_ins', timestamps: false },
  )
}
