import { SequelizeStorage, Umzug } from 'umzug'
import { connect } from '@/models/connect'
import { migrations } from './index'

type Say = (line: string) => void

/** Brings the tables up to date, or with `down` takes them all away again. Says each step. */
export async function migrate(url: string, direction: 'up' | 'down', say: Say): Promise<void> {
  const sequelize = connect(url)
  try {
    const umzug = new Umzug({
      migrations: migrations.map(({ name, up, down }) => ({
        name,
        up: async () => void (await up((statement) => sequelize.query(statement))),
        down: async () => void (await down((statement) => sequelize.query(statement))),
      })),
      storage: new SequelizeStorage({ sequelize, tableName: 'migrations' }),
      logger: undefined,
    })
    umzug.on('migrated', ({ name }) => say(`made ${name}`))
    umzug.on('reverted', ({ name }) => say(`took back ${name}`))
    if (direction === 'up') await umzug.up()
    else await umzug.down({ to: 0 })
  } finally {
    await sequelize.close()
  }
}
