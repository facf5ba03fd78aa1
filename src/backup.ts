import { type Config, readConfig } from './config.ts'
import { backupStore } from './store/backup.ts'

/** `npm run backup -- <file>`: a copy of the SQLite store, made while the service runs. */
async function run({ DATABASE_URL, DATA_DIR }: Config, target: string | undefined): Promise<string> {
  if (DATABASE_URL) throw new Error('DATABASE_URL is set: back PostgreSQL up with pg_dump (see README)')
  if (!target) throw new Error('name the file to write: npm run backup -- kentledge-backup.sqlite')
  await backupStore(DATA_DIR, target)
  return `${target} written and checked`
}

try {
  process.stdout.write(`${await run(readConfig(process.env), process.argv[2])}\n`)
} catch (fault) {
  process.stderr.write(`${(fault as Error).message}\n`)
  process.exitCode = 1
}
