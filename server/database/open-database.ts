/**
 * One writer handle. Writes go through `writeTransaction`: a synchronous IMMEDIATE transaction, so
 * no other code can run in its middle and no read turns stale before the write. Kysely builds the
 * SQL; the statements run synchronously on the handle.
 */
import SqliteHandle from 'better-sqlite3'
import { type CompiledQuery, type Driver, Kysely, SqliteDialect } from 'kysely'
import type { Database } from './database'

/** Any Kysely query that can be compiled; `Row` is what it selects or returns. */
export interface Compilable<Row> {
  compile(): CompiledQuery<Row>
}

export interface Queries {
  /** Builds queries; its own transactions are refused. */
  readonly kysely: Kysely<Database>
  all<Row>(query: Compilable<Row>): Row[]
  first<Row>(query: Compilable<Row>): Row | undefined
  /** For statements without RETURNING. */
  run(query: Compilable<unknown>): { changes: number }
}

/** Only `writeTransaction` makes one, so a function that asks for it cannot run outside. */
export interface WriteTransaction extends Queries {
  readonly isWriteTransaction: true
}

export interface AppDatabase extends Queries {
  readonly handle: SqliteHandle.Database
  writeTransaction<Result>(work: (tx: WriteTransaction) => Synchronous<Result>): Result
  close(): void
}

/** A callback that returns a promise does not compile: the transaction would end before its work. */
type Synchronous<Result> = Result extends PromiseLike<unknown> ? never : Result

/** Longer would only block the event loop: all writers are in this process and never overlap. */
const BUSY_TIMEOUT_MS = 250
const JOURNAL_SIZE_LIMIT_BYTES = 64 * 1024 * 1024
const STATEMENT_CACHE_SIZE = 300

/** Every handle of the process is opened here, so that none misses a pragma. */
export function openHandle(file: string): SqliteHandle.Database {
  const handle = new SqliteHandle(file, { timeout: BUSY_TIMEOUT_MS })
  handle.pragma('journal_mode = WAL')
  // better-sqlite3 is built to open WAL files with NORMAL, which may lose acknowledged commits on power loss.
  handle.pragma('synchronous = FULL')
  handle.pragma('foreign_keys = ON')
  // Without it INSERT OR REPLACE passes by the triggers that protect releases.
  handle.pragma('recursive_triggers = ON')
  handle.pragma('trusted_schema = OFF')
  handle.pragma(`journal_size_limit = ${JOURNAL_SIZE_LIMIT_BYTES}`)
  return handle
}

export function openDatabase(file: string): AppDatabase {
  const handle = openHandle(file)
  const statements = new Map<string, SqliteHandle.Statement>()

  function prepare(sql: string): SqliteHandle.Statement {
    const cached = statements.get(sql)
    if (cached) return cached
    if (statements.size >= STATEMENT_CACHE_SIZE) {
      const [oldest] = statements.keys()
      if (oldest !== undefined) statements.delete(oldest)
    }
    const statement = handle.prepare(sql)
    statements.set(sql, statement)
    return statement
  }

  const queries: Queries = {
    kysely: new Kysely<Database>({ dialect: new QueryOnlyDialect({ database: handle }) }),
    all<Row>(query: Compilable<Row>): Row[] {
      const { sql, parameters } = query.compile()
      return prepare(sql).all(...parameters) as Row[]
    },
    first<Row>(query: Compilable<Row>): Row | undefined {
      const { sql, parameters } = query.compile()
      return prepare(sql).get(...parameters) as Row | undefined
    },
    run(query) {
      const { sql, parameters } = query.compile()
      return { changes: prepare(sql).run(...parameters).changes }
    },
  }
  const transaction: WriteTransaction = { ...queries, isWriteTransaction: true }

  return {
    ...queries,
    handle,
    writeTransaction(work) {
      return handle.transaction(() => work(transaction)).immediate()
    },
    close() {
      // Folds the write-ahead log back, so that a stopped server leaves one file.
      handle.pragma('wal_checkpoint(TRUNCATE)')
      handle.close()
    },
  }
}

/**
 * An asynchronous Kysely transaction on the shared handle would swallow every statement that other
 * code runs before its commit, and undo them with it.
 */
class QueryOnlyDialect extends SqliteDialect {
  override createDriver(): Driver {
    const driver = super.createDriver()
    driver.beginTransaction = () =>
      Promise.reject(new Error('Use writeTransaction: asynchronous transactions share the handle'))
    return driver
  }
}
