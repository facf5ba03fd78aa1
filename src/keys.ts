import { parseArgs } from 'node:util'
import { readConfig } from './config.ts'
import { type Scope, scopes } from './store/actor.ts'
import { listKeys, makeKey, revokeKey, rotateKey, stateOf } from './store/keys.ts'
import { openStore, type Store } from './store/open-store.ts'

const usage = `npm run keys -- make --name <person or pipeline> --scopes <${scopes.join(',')}> [--projects <slug,…>] [--expires <date>]
npm run keys -- list
npm run keys -- rotate <id> [--grace <seconds>]   a new key of the same rights; the old one ends after the grace (0)
npm run keys -- revoke <id>`

const list = (text: string) =>
  text
    .split(',')
    .map((part) => part.trim())
    .filter((part) => part !== '')

function scopesOf(text: string | undefined): Scope[] {
  const asked = list(text ?? '')
  const strange = asked.filter((scope) => !scopes.includes(scope as Scope))
  if (asked.length === 0 || strange.length > 0)
    throw new Error(
      `--scopes takes one or more of ${scopes.join(', ')}${strange.length > 0 ? `; got ${strange.join(', ')}` : ''}`,
    )
  return asked as Scope[]
}

function dateOf(text: string | undefined): Date | undefined {
  if (text === undefined) return undefined
  const date = new Date(text)
  if (Number.isNaN(date.getTime())) throw new Error(`--expires takes a date such as 2030-12-31; got ${text}`)
  return date
}

const shownOnce = ({ id, key }: { id: string; key: string }) => `key ${id}, shown this once:\n${key}`

async function obey(store: Store, [verb, id]: readonly string[], given: Readonly<Record<string, string | undefined>>) {
  if (verb === 'make') {
    if (!given.name?.trim()) throw new Error('--name is missing: the person or pipeline that records shall show')
    const projects = given.projects === undefined ? ['*'] : list(given.projects)
    if (projects.length === 0) throw new Error('--projects names no project; leave it out for all of them')
    const rights = {
      name: given.name.trim(),
      scopes: scopesOf(given.scopes),
      projects,
      expiresAt: dateOf(given.expires),
    }
    return shownOnce(await makeKey(store, rights))
  }
  if (verb === 'list') {
    const now = store.clock()
    const rows = (await listKeys(store)).map((k) =>
      [
        k.id,
        stateOf(k, now),
        k.name,
        JSON.parse(k.scopes),
        JSON.parse(k.projects),
        k.created_at,
        k.expires_at ?? '',
      ].join('\t'),
    )
    return ['id\tstate\tname\tscopes\tprojects\tmade\texpires', ...rows].join('\n')
  }
  if (verb === 'rotate' && id) {
    const grace = Number(given.grace ?? 0)
    if (!Number.isInteger(grace) || grace < 0) throw new Error(`--grace takes whole seconds; got ${given.grace}`)
    const made = await rotateKey(store, id, grace)
    if (!made) throw new Error(`there is no valid key ${id}`)
    return shownOnce(made)
  }
  if (verb === 'revoke' && id) {
    if (!(await revokeKey(store, id))) throw new Error(`there is no key ${id} to revoke`)
    return `key ${id} revoked`
  }
  throw new Error(usage)
}

/** `npm run keys -- …`: makes, lists, rotates and revokes keys in the store that the environment names, while a service runs or not. */
async function run(): Promise<string> {
  const text = { type: 'string' } as const
  const options = { name: text, scopes: text, projects: text, expires: text, grace: text }
  const { values, positionals } = parseArgs({ options, allowPositionals: true })
  const { DATABASE_URL: url, DATA_DIR: folder } = readConfig(process.env)
  const store = await openStore({ url, folder })
  try {
    return await obey(store, positionals, values)
  } finally {
    await store.close()
  }
}

try {
  process.stdout.write(`${await run()}\n`)
} catch (fault) {
  process.stderr.write(`${(fault as Error).message}\n`)
  process.exitCode = 1
}
