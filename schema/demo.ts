import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { openAsBlob } from 'node:fs'
import { mkdtemp, readFile, rm } from 'node:fs/promises'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { setTimeout as wait } from 'node:timers/promises'
import { fileURLToPath } from 'node:url'

/** Starts the service, posts the demo schedule and its CSV of reactions as a model exporter would, prints the verdicts, stops the service. */

type Check = { check: string; combination: string; demand: number; resistance: number; utilisation: number }
type Operand = { symbol: string; value: number; unit: string }
type Step = {
  id: string
  kind: string
  symbol: string
  name: string
  value: number
  unit: string
  formula?: string
  operands?: Operand[]
  source?: { key: string; locator: string }
}
type Answer = {
  result: {
    summary: { caps: number; satisfied: number; exceeded: number; worst: Omit<Check, 'demand'> & { cap: string } }
    caps: { mark: string; pileCount: number; checks: Check[]; settlement: { settlement: number }[] }[]
    neighbours: { a: string; b: string; angularDistortion: number; utilisation?: number }[]
  }
  trace: { steps: Step[]; results: Record<string, string> }
  notices: { text: string }[]
  meta: { engine: string; requestHash: string }
}

const example = (name: string) => fileURLToPath(new URL(`examples/${name}`, import.meta.url))
const print = (line = '') => process.stdout.write(`${line}\n`)

/** A port that nobody listens on at this moment. */
async function freePort(): Promise<number> {
  const server = createServer().listen(0, '127.0.0.1')
  await once(server, 'listening')
  const { port } = server.address() as { port: number }
  server.close()
  await once(server, 'close')
  return port
}

async function startService(dataDir: string) {
  const port = await freePort()
  const service = spawn(process.execPath, [fileURLToPath(new URL('../src/main.ts', import.meta.url))], {
    // Nothing else of the environment: the demo touches no store of the operator.
    env: {
      PATH: process.env.PATH,
      SystemRoot: process.env.SystemRoot,
      HOST: '127.0.0.1',
      PORT: String(port),
      DATA_DIR: dataDir,
      AUTH: 'off',
      LOG_LEVEL: 'warn',
    },
    stdio: ['ignore', 'inherit', 'inherit'],
  })
  const address = `http://127.0.0.1:${port}`
  for (let tries = 0; tries < 300; tries++) {
    if (service.exitCode !== null) throw new Error(`the service ended with ${service.exitCode}`)
    const ready = await fetch(`${address}/readyz`).catch(() => undefined)
    if (ready?.ok) return { service, address }
    await wait(100)
  }
  service.kill()
  throw new Error('the service was not ready after 30 s')
}

async function postSchedule(address: string): Promise<Answer> {
  const form = new FormData()
  form.set('schedule', new Blob([await readFile(example('demo-schedule.json'))], { type: 'application/json' }))
  form.set('loads', await openAsBlob(example('demo-loads.csv'), { type: 'text/csv' }), 'demo-loads.csv')
  const reply = await fetch(`${address}/v1/assessments`, { method: 'POST', body: form })
  if (!reply.ok) throw new Error(`${reply.status}: ${await reply.text()}`)
  return (await reply.json()) as Answer
}

function printVerdicts({ caps, summary, neighbours }: Answer['result']): void {
  const row = (cap: string, piles: string, check: string, combination: string, use: string, settlement: string) =>
    print(
      `${cap.padEnd(5)}${piles.padStart(6)}  ${check.padEnd(18)}  ${combination.padEnd(11)}  ${use.padStart(11)}  ${settlement.padStart(13)}`,
    )
  row('cap', 'piles', 'governing check', 'combination', 'utilisation', 'settlement mm')
  for (const cap of caps) {
    const worst = cap.checks.reduce((a, b) => (b.utilisation > a.utilisation ? b : a))
    const settlement = Math.max(...cap.settlement.map((s) => s.settlement))
    const use = `${worst.utilisation > 1 ? '! ' : ''}${worst.utilisation.toFixed(2)}`
    row(cap.mark, String(cap.pileCount), worst.check, worst.combination, use, settlement.toFixed(1))
  }
  print()
  print(`${summary.caps} caps: ${summary.satisfied} satisfied, ${summary.exceeded} exceeded (!).`)
  const [steepest] = [...neighbours].sort((a, b) => b.angularDistortion - a.angularDistortion)
  if (steepest)
    print(
      `Steepest pair of ${neighbours.length}: ${steepest.a} to ${steepest.b}, angular distortion 1 in ${Math.round(1 / steepest.angularDistortion)}, utilisation ${steepest.utilisation?.toFixed(2)}.`,
    )
}

/** The steps right above the worst utilisation, read up from `trace.results`, as a checker would. */
function printWorst({ result, trace }: Answer): void {
  const { cap, check, combination } = result.summary.worst
  const at = trace.results['/summary/worst/utilisation']
  const byId = new Map(trace.steps.map((step) => [step.id, step]))
  print(`How ${cap}, ${check}, ${combination} came about (the last steps of ${trace.steps.length}):`)
  const wanted = new Set<string>()
  let front = at === undefined ? [] : [at]
  for (let depth = 0; depth < 3; depth++) {
    for (const id of front) wanted.add(id)
    front = front.flatMap((id) => {
      const step = byId.get(id)
      return step && 'operands' in step ? (step.operands as (Operand & { from: string })[]).map((o) => o.from) : []
    })
  }
  for (const step of trace.steps.filter((s) => wanted.has(s.id))) {
    const value = `${step.symbol.padEnd(6)} = ${step.value.toPrecision(5).padStart(9)} ${step.unit.padEnd(6)}`
    print(`  ${value}  ${step.name}${step.formula ? `: ${step.formula}` : ''}`)
    if (step.formula && step.operands)
      print(`${' '.repeat(28)}with ${step.operands.map((o) => `${o.symbol} = ${+o.value.toPrecision(5)}`).join(', ')}`)
  }
}

async function linksOf(address: string): Promise<string[]> {
  const paths = ['/reference', '/openapi.json', '/graphql/explorer', '/v1/methods', '/v1/sources']
  const found = await Promise.all(paths.map(async (path) => (await fetch(address + path)).ok))
  return paths.filter((_, i) => found[i])
}

const dataDir = await mkdtemp(join(tmpdir(), 'kentledge-demo-'))
const { service, address } = await startService(dataDir)
try {
  const { title } = JSON.parse(await readFile(example('demo-schedule.json'), 'utf8')) as { title: string }
  const answer = await postSchedule(address)
  print(title)
  print()
  printVerdicts(answer.result)
  print()
  printWorst(answer)
  print()
  print(`${answer.meta.engine}, request ${answer.meta.requestHash}`)
  print(answer.notices[0]?.text)
  print()
  print('`npm start` keeps the service up. Then open:')
  for (const path of await linksOf(address)) print(`  http://127.0.0.1:8080${path}`)
  print('  http://127.0.0.1:8080/graphql (POST)')
} finally {
  service.kill('SIGTERM')
  if (service.exitCode === null) await once(service, 'exit')
  await rm(dataDir, { recursive: true, force: true })
}
