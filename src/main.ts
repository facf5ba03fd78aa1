import { buildService } from './app.ts'
import { type Config, readConfig } from './config.ts'

function settings(): Config {
  try {
    return readConfig(process.env)
  } catch (fault) {
    process.stderr.write(`${(fault as Error).message}\n`)
    process.exit(1)
  }
}

const config = settings()
const { app, stop } = await buildService(config)
await app.listen({ host: config.HOST, port: config.PORT })

let stopping = false
for (const signal of ['SIGTERM', 'SIGINT'] as const) {
  process.on(signal, () => {
    // A second signal does not wait for requests that are under way.
    if (stopping) process.exit(1)
    stopping = true
    setTimeout(() => process.exit(1), config.SHUTDOWN_TIMEOUT * 1000).unref()
    void stop
      .begin()
      .then(() => app.close())
      .then(() => process.exit(0))
  })
}
