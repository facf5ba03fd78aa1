import { buildService } from './app.ts'
import { type Config, readConfig } from './config.ts'
import { isGuarded } from './operations/authenticate.ts'
import { openStore, type Store } from './store/open-store.ts'

function settings(): Config {
  try {
    return readConfig(process.env)
  } catch (fault) {
    process.stderr.write(`${(fault as Error).message}\n`)
    process.exit(1)
  }
}

async function openedStore({ DATABASE_URL: url, DATA_DIR: folder }: Config): Promise<Store> {
  const report = (fault: Error) => process.stderr.write(`A connection to the database was lost: ${fault.message}\n`)
  try {
    return await openStore({ url, folder, report })
  } catch (fault) {
    const { message, cause } = fault as Error
    process.stderr.write(`The store cannot be opened: ${cause instanceof Error ? cause.message : message}\n`)
    process.exit(1)
  }
}

const loopback = ['127.0.0.1', '::1', 'localhost']

/** Where to listen. Without any key the service is open to whoever reaches it, so it stays on its own machine unless AUTH=off says otherwise. */
async function hostOf({ HOST, AUTH }: Config, store: Store): Promise<string> {
  if (AUTH === 'keys' && (loopback.includes(HOST) || (await isGuarded({ store })))) return HOST
  if (AUTH === 'off') {
    app.log.warn(`AUTH=off: whoever reaches ${HOST} may read and write every project`)
    return HOST
  }
  app.log.warn(
    `NO KEYS: listening on 127.0.0.1 instead of ${HOST}. Make a key (npm run keys -- make) and start again, or set AUTH=off`,
  )
  return '127.0.0.1'
}

const config = settings()
const store = await openedStore(config)
const { app, stop, stopJobs } = await buildService(config, store)
await app.listen({ host: await hostOf(config, store), port: config.PORT })

let stopping = false
for (const signal of ['SIGTERM', 'SIGINT'] as const) {
  process.on(signal, () => {
    // A second signal does not wait for requests that are under way.
    if (stopping) process.exit(1)
    stopping = true
    const budget = config.SHUTDOWN_TIMEOUT * 1000
    setTimeout(() => process.exit(1), budget).unref()
    // Jobs that take longer go back into line, which takes a moment too.
    void Promise.all([stop.begin(), stopJobs(0.8 * budget)])
      .then(() => app.close())
      .then(() => process.exit(0))
  })
}
