import mariadb from 'mariadb'
import { Sequelize } from 'sequelize'
import { databaseUrl } from '@/lib/config'

/** Opens a pool. Parameters stay out of errors and logs, as they hold what people typed. */
export function connect(url: string): Sequelize {
  const { hostname, port, username, password, pathname } = new URL(url)
  return new Sequelize({
    dialect: 'mariadb',
    dialectModule: mariadb,
    host: hostname,
    port: port === '' ? 3306 : Number(port),
    username: decodeURIComponent(username),
    password: decodeURIComponent(password),
    database: decodeURIComponent(pathname.slice(1)),
    timezone: '+00:00',
    dialectOptions: { logParam: false },
    logging: false,
    pool: { max: 10, acquire: 20_000 },
    define: { charset: 'utf8mb4', collate: 'utf8mb4_unicode_ci' },
  })
}

const kept = globalThis as typeof globalThis & { longpointDatabase?: Sequelize }

/** The process's one pool. It survives hot reload, which loads this file again. */
export function database(): Sequelize {
  kept.longpointDatabase ??= connect(databaseUrl())
  return kept.longpointDatabase
}
