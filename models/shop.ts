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

/** A school, a local, an employer: the wall nothing crosses. */
export class Shop extends Model<InferAttributes<Shop>, InferCreationAttributes<Shop>> {
  declare id: CreationOptional<string>
  declare name: string
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

export function defineShop(sequelize: Sequelize) {
  Shop.init(
    {
      id: { type: idColumn, primaryKey: true, defaultValue: () => uuidv7() },
      name: DataTypes.STRING(80),
      createdAt: instantColumn,
      updatedAt: instantColumn,
    },
    { sequelize, modelName: 'Shop', tableName: 'shops' },
  )
}
