import { type ChildProcess, spawn } from 'node:child_process'
import { once } from 'node:events'
import { mkdtempSync, rmSync } from 'node:fs'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { setTimeout as wait } from 'node:timers/promises'
import { fileURLToPath } from 'node:url'

/** A port that nobody listens on at this moment. */
export async function freePort(): Promise<number> {
  const server = createServer().listen(0, '127.0.0.1')
  await once(server, 'listening')
  const { port } = server.address() as { port: number }
  server.close()
  await once(server, 'close')
  return port
}

export type Start = {
  /** Program and its arguments; left out, the service of this tree. */
  readonly command?: readonly string[]
  readonly cwd?: string
  readonly env?: Readonly<Record<string, string>>
  readonly user?: { readonly uid: number; readonly gid: number }
}
export type Started = { readonly child: ChildProcess; readonly address: string; readonly log: () => string }

const root = fileURLToPath(new URL('../../', import.meta.url))

/** Starts the service as a process of its own, with no other environment than given, and waits until it takes work. */
export async function startService(start: Start = {}): Promise<Started> {
  const [program, ...args] = start.command ?? [process.execPath, 'src/main.ts']
  const port = await freePort()
  const data = mkdtempSync(join(tmpdir(), 'kentledge-data-'))
  const child = spawn(program!, args, {
    cwd: start.cwd ?? root,
    env: { LOG_LEVEL: 'warn', DATA_DIR: data, ...start.env, PORT: String(port) },
    stdio: ['ignore', 'pipe', 'pipe'],
    ...start.user,
  })
  child.once('exit', () => rmSync(data, { recursive: true, force: true }))
  let log = ''
  for (const stream of [child.stdout!, child.stderr!])
    stream.on('data', (chunk) => {
      log += chunk
    })
  let failed: Error | undefined
  child.once('error', (error) => {
    failed = error
  })
  const address = `http://127.0.0.1:${port}`
  for (let tries = 0; tries < 300; tries++) {
    const ready = await fetch(`${address}/readyz`).catch(() => undefined)
    if (ready?.ok) return { child, address, log: () => log }
    if (failed || child.exitCode !== null) break
    await wait(100)
  }
  child.kill('SIGKILL')
  throw new Error(`the service did not start (exit code ${child.exitCode}): ${failed?.message ?? ''}${log}`)
}

/** Ends a service at once, and waits until its folder is gone too. */
export async function endService(service: Started | undefined): Promise<void> {
  const { child } = service ?? {}
  if (!child || child.exitCode !== null || child.signalCode !== null) return
  const exit = once(child, 'exit')
  child.kill('SIGKILL')
  await exit
}
