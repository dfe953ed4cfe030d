import {
  DataTypes,
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize'
import { idKey, instantColumn } from './columns'

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
      id: idKey(),
      name: DataTypes.STRING(80),
      createdAt: instantColumn,
      updatedAt: instantColumn,
    },
    { sequelize, modelName: 'Shop', tableName: 'shops' },
  )
}
