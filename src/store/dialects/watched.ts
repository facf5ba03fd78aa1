import { CompiledQuery, type DatabaseConnection, type Dialect, type Driver } from 'kysely'
import { Problem } from '../../errors.ts'

/** Told of each call before it goes to the database; what it throws happens in place of the call. */
export type Watch = (sql: string) => void

/** What the database refuses or fails at is told as `store-unavailable`, with the fault as its cause for the log. */
async function told<T>(call: () => Promise<T>): Promise<T> {
  try {
    return await call()
  } catch (cause) {
    throw cause instanceof Problem ? cause : Object.assign(new Problem('store-unavailable'), { cause })
  }
}

/** A dialect whose every call passes by `watch`: faults are told in one way, and tests let the n-th call fail. `begin` opens a transaction. */
export function watched(dialect: Dialect, begin: string, watch: Watch): Dialect {
  const inner = new WeakMap<DatabaseConnection, DatabaseConnection>()
  const outer = new WeakMap<DatabaseConnection, DatabaseConnection>()
  const own = (connection: DatabaseConnection) => inner.get(connection)!
  const seen = <T>(sql: string, call: () => Promise<T>) =>
    told(() => {
      watch(sql)
      return call()
    })
  const wrap = (connection: DatabaseConnection): DatabaseConnection => {
    const made: DatabaseConnection = {
      executeQuery: (query, options) => seen(query.sql, () => connection.executeQuery(query, options)),
      streamQuery: (query, size, options) => connection.streamQuery(query, size, options),
    }
    inner.set(made, connection)
    outer.set(connection, made)
    return made
  }
  const driverOf = (driver: Driver): Driver => ({
    init: (options) => told(() => driver.init(options)),
    async acquireConnection(options) {
      const connection = await told(() => driver.acquireConnection(options))
      return outer.get(connection) ?? wrap(connection)
    },
    releaseConnection: (connection, options) => driver.releaseConnection(own(connection), options),
    beginTransaction: async (connection) => {
      await connection.executeQuery(CompiledQuery.raw(begin))
    },
    commitTransaction: (connection) => seen('commit', () => driver.commitTransaction(own(connection))),
    // Not watched: a rollback that fails would hide what failed before it.
    rollbackTransaction: (connection) => driver.rollbackTransaction(own(connection)),
    destroy: (options) => driver.destroy(options),
  })
  return {
    createDriver: () => driverOf(dialect.createDriver()),
    createAdapter: () => dialect.createAdapter(),
    createIntrospector: (db) => dialect.createIntrospector(db),
    createQueryCompiler: () => dialect.createQueryCompiler(),
  }
}
