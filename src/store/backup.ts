import { existsSync, renameSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { backup } from 'node:sqlite'
import { openSqlite } from './dialects/sqlite.ts'
import { FILE } from './open-store.ts'

/**
 * Copies the SQLite store of a folder to a file while a service writes to it. The copy stands under its name only when it is
 * whole and sound. Throws when there is no store, the target exists, or the copy fails SQLite's own check.
 */
export async function backupStore(folder: string, target: string): Promise<void> {
  const source = join(folder, FILE)
  if (!existsSync(source)) throw new Error(`there is no store at ${source}`)
  if (existsSync(target)) throw new Error(`${target} exists already`)
  const part = `${target}.part`
  const db = openSqlite(source, { readOnly: true })
  try {
    await backup(db, part, { rate: 1000 })
  } finally {
    db.close()
  }
  const copy = openSqlite(part)
  // Out of WAL, so that the copy is one file.
  copy.exec('pragma journal_mode = delete')
  const { integrity_check: said } = copy.prepare('pragma integrity_check').get() as { integrity_check: string }
  copy.close()
  if (said !== 'ok') {
    rmSync(part, { force: true })
    throw new Error(`the copy is not sound: ${said}`)
  }
  renameSync(part, target)
}
