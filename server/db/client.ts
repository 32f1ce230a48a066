import { drizzle } from 'drizzle-orm/mysql2'
import { createPool, type Pool } from 'mysql2/promise'
import { config } from '../config'
import * as schema from './schema'

/** Opens a pool whose every connection speaks UTC and utf8mb4. */
export function createDatabasePool(url: string, connectionLimit = 12): Pool {
  const pool = createPool({
    uri: url,
    connectionLimit,
    timezone: 'Z',
    charset: 'utf8mb4_unicode_ci',
    supportBigNumbers: true,
    enableKeepAlive: true,
  })
  pool.on('connection', (connection) => {
    void connection.query("set time_zone = '+00:00', innodb_lock_wait_timeout = 10")
  })
  return pool
}

export const pool = createDatabasePool(config.databaseUrl)
export const db = drizzle(pool, { schema, mode: 'default' })

export type Database = typeof db
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0]
/** What a query runs on: the pool, or the transaction it is part of. */
export type Executor = Database | Transaction
