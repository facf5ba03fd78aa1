import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { mkdtemp, readFile, rm } from 'node:fs/promises'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { setTimeout as wait } from 'node:timers/promises'
import { fileURLToPath } from 'node:url'
import { kentledge, type Schemas } from './client.ts'
import { type Demo, movedGround, movedLoads, tellChanges } from './demo-revision.ts'

/**
 * Starts the service, posts the demo schedule and its CSV of reactions as a model exporter would, prints the verdicts; keeps it
 * in a project, posts the next revision, prints what changed; stops the service.
 */

type Answer = Schemas['AssessmentAnswer']

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
function printWorst({ result: { summary }, trace }: Answer): void {
  if (!summary.worst || !trace) throw new Error('the answer has no worst check or no trace')
  const { cap, check, combination } = summary.worst
  print(`How ${cap}, ${check}, ${combination} came about (the last steps of ${trace.steps.length}):`)
  const byId = new Map(trace.steps.map((step) => [step.id, step]))
  const wanted = new Set<string>()
  let front = [trace.results['/summary/worst/utilisation']]
  for (let depth = 0; depth < 3; depth++) {
    const steps = front.flatMap((id) => byId.get(id ?? '') ?? [])
    for (const step of steps) wanted.add(step.id)
    front = steps.flatMap((step) => ('operands' in step ? step.operands.map((o) => o.from) : []))
  }
  for (const step of trace.steps.filter((s) => wanted.has(s.id))) {
    const value = `${step.symbol.padEnd(6)} = ${step.value.toPrecision(5).padStart(9)} ${step.unit.padEnd(6)}`
    print(`  ${value}  ${step.name}${step.kind === 'formula' ? `: ${step.formula}` : ''}`)
    if (step.kind === 'formula')
      print(`${' '.repeat(28)}with ${step.operands.map((o) => `${o.symbol} = ${+o.value.toPrecision(5)}`).join(', ')}`)
  }
}

async function linksOf(address: string): Promise<string[]> {
  const paths = ['/reference', '/openapi.json', '/graphql/explorer', '/v1/methods', '/v1/sources']
  const found = await Promise.all(paths.map(async (path) => (await fetch(address + path)).ok))
  return paths.filter((_, i) => found[i])
}

/** Keeps the schedule as revision 1 of a project, what the model says a week later as revision 2, and tells what changed. */
async function printRevisions(client: ReturnType<typeof kentledge>, schedule: Demo, loads: string): Promise<void> {
  await client.putProject('river-quay', schedule.title)
  const first = await client.recordCsv('river-quay', schedule, loads)
  const second = await client.recordCsv('river-quay', movedGround(schedule), movedLoads(loads))
  print(`Kept in project river-quay as ${first.recordHash} and ${second.recordHash}.`)
  for (const line of tellChanges(await client.changes(second.id))) print(line)
}

const dataDir = await mkdtemp(join(tmpdir(), 'kentledge-demo-'))
const { service, address } = await startService(dataDir)
try {
  const schedule = JSON.parse(await readFile(example('demo-schedule.json'), 'utf8')) as Demo
  const loads = await readFile(example('demo-loads.csv'), 'utf8')
  const client = kentledge({ baseUrl: address })
  const answer = await client.assessCsv(schedule, loads)
  print(schedule.title)
  print()
  printVerdicts(answer.result)
  print()
  printWorst(answer)
  print()
  print(`${answer.meta.engine}, request ${answer.meta.requestHash}`)
  print(answer.notices[0]?.text)
  print()
  await printRevisions(client, schedule, loads)
  print()
  print('`npm start` keeps the service up. Then open:')
  for (const path of await linksOf(address)) print(`  http://127.0.0.1:8080${path}`)
  print('  http://127.0.0.1:8080/graphql (POST)')
} finally {
  service.kill('SIGTERM')
  if (service.exitCode === null) await once(service, 'exit')
  await rm(dataDir, { recursive: true, force: true })
}
