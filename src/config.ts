import { readFileSync } from 'node:fs'
import { availableParallelism } from 'node:os'
import { z } from 'zod'

const whole = (fallback: number, min: number, max: number) =>
  z.coerce.number().int().min(min).max(max).default(fallback)
const schema = z.object({
  HOST: z.string().min(1).default('127.0.0.1'),
  PORT: whole(8080, 0, 65535),
  DATA_DIR: z.string().min(1).default('./data'),
  DATABASE_URL: z
    .string()
    .regex(/^postgres(ql)?:\/\//, 'must begin with postgres://')
    .optional(),
  AUTH: z.enum(['keys', 'off']).default('keys'),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'trace', 'silent']).default('info'),
  BODY_LIMIT: whole(64 * 1024 * 1024, 1024, 2 ** 31),
  REQUEST_TIMEOUT: whole(60, 1, 3600),
  WORKERS: whole(availableParallelism(), 1, 256),
  WORK_QUEUE: whole(32, 0, 10_000),
  WORK_TIMEOUT: whole(120, 1, 3600),
  JOB_QUEUE: whole(1000, 0, 1_000_000),
  NODE_ENV: z.string().default('development'),
  SHUTDOWN_TIMEOUT: whole(10, 1, 3600),
})

/** What was read, but for addresses: they hold a password. */
const shown = (given: Readonly<Record<string, string>>, name: string) =>
  name === 'DATABASE_URL' ? 'another address' : `"${given[name]}"`

export type Config = Readonly<z.infer<typeof schema>>

/** The settings from the environment; `NAME_FILE` names a file that holds the value of NAME. Throws one error that tells all faults. */
export function readConfig(env: Readonly<Record<string, string | undefined>>): Config {
  const given: Record<string, string> = {}
  const faults: string[] = []
  for (const name of Object.keys(schema.shape)) {
    const file = env[`${name}_FILE`]
    if (env[name] !== undefined && env[name] !== '') given[name] = env[name]
    else if (file) {
      try {
        given[name] = readFileSync(file, 'utf8').trim()
      } catch {
        faults.push(`${name}_FILE: cannot read ${file}`)
      }
    }
  }
  const read = schema.safeParse(given)
  if (!read.success)
    faults.push(
      ...read.error.issues.map((i) => `${i.path.join('.')}: ${i.message}; got ${shown(given, String(i.path[0]))}`),
    )
  if (faults.length > 0)
    throw new Error(`The environment has ${faults.length} fault(s):\n${faults.map((f) => `  ${f}`).join('\n')}`)
  return Object.freeze(read.data!)
}
