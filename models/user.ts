import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize'
import type { Preferences, Role } from '@/lib/schemas/account'
import { idColumn, idKey, instantColumn } from './columns'

/** A person who signs in. */
export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: CreationOptional<string>
  declare shopId: string
  declare name: string
  declare email: string
  declare passwordHash: string
  declare role: Role
  declare disabledAt: CreationOptional<Date | null>
  /** Of the demo shop, whose passwords are printed: never to be reached from beyond loopback. */
  declare demo: CreationOptional<boolean>
  declare units: CreationOptional<Preferences['units']>
  declare tape: CreationOptional<Preferences['tape']>
  declare sawSquare: CreationOptional<Preferences['sawSquare']>
  declare dialStep: CreationOptional<Preferences['dialStep']>
  declare theme: CreationOptional<Preferences['theme']>
  declare version: CreationOptional<number>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

export function defineUser(sequelize: Sequelize) {
  User.init(
    {
      id: idKey(),
      shopId: idColumn,
      name: DataTypes.STRING(80),
      email: DataTypes.STRING(254),
      passwordHash: DataTypes.STRING(255),
      role: DataTypes.STRING(20),
      disabledAt: instantColumn,
      demo: DataTypes.BOOLEAN,
      units: DataTypes.STRING(2),
      tape: DataTypes.INTEGER,
      sawSquare: DataTypes.INTEGER,
      dialStep: DataTypes.DECIMAL(3, 2),
      theme: DataTypes.STRING(10),
      version: DataTypes.INTEGER,
      createdAt: instantColumn,
      updatedAt: instantColumn,
    },
    { sequelize, modelName: 'User', tableName: 'users' },
  )
}
