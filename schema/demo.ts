import { readFileSync } from 'node:fs'
import { buildApp } from '../src/app.ts'
import { readConfig } from '../src/config.ts'

/** Starts the service on a free port, posts the example schedule over HTTP, prints the verdicts and the worst check's trace. */
const app = await buildApp(readConfig({ PORT: '0', LOG_LEVEL: 'warn' }))
const address = await app.listen({ host: '127.0.0.1', port: 0 })

const schedule = readFileSync(new URL('examples/assessment.json', import.meta.url), 'utf8')
const reply = await fetch(`${address}/v1/assessments`, {
  method: 'POST',
  headers: { 'content-type': 'application/json' },
  body: schedule,
})
if (!reply.ok) throw new Error(await reply.text())

type Check = { check: string; combination: string; demand: number; resistance: number; utilisation: number }
type Step = { id: string; name: string; symbol: string; value: number; unit: string; formula?: string; reason?: string }
const { result, trace, notices } = (await reply.json()) as {
  result: {
    summary: {
      caps: number
      satisfied: number
      exceeded: number
      worst: { cap: string; check: string; utilisation: number }
    }
    caps: { mark: string; pileCount: number; checks: Check[]; settlement: { settlement: number }[] }[]
  }
  trace: { steps: Step[] }
  notices: { text: string }[]
}

const print = (line = '') => process.stdout.write(`${line}\n`)
const row = (...cells: [string, string, string, string, string, string]) =>
  print(
    `${cells[0].padEnd(6)}${cells[1].padStart(6)}  ${cells[2].padEnd(20)}${cells[3].padEnd(13)}${cells[4].padStart(11)}${cells[5].padStart(15)}`,
  )
print((JSON.parse(schedule) as { title: string }).title)
print()
row('cap', 'piles', 'governing check', 'combination', 'utilisation', 'settlement mm')
for (const cap of result.caps) {
  const worst = cap.checks.reduce((a, b) => (b.utilisation > a.utilisation ? b : a))
  const settlement = Math.max(...cap.settlement.map((s) => s.settlement))
  row(
    cap.mark,
    String(cap.pileCount),
    worst.check,
    worst.combination,
    `${worst.utilisation.toFixed(2)}${worst.utilisation > 1 ? ' !' : '  '}`,
    settlement.toFixed(1),
  )
}
const { caps, satisfied, exceeded, worst } = result.summary
print()
print(
  `${caps} caps: ${satisfied} satisfied, ${exceeded} exceeded (!). Worst: ${worst.cap}, ${worst.check}, utilisation ${worst.utilisation.toFixed(2)}.`,
)
print()
print(`How ${worst.cap} ${worst.check} came about:`)
for (const step of trace.steps.filter((s) => s.id.startsWith(`caps/${worst.cap}/${worst.check}/`))) {
  print(
    `  ${step.symbol.padEnd(6)}= ${step.value.toPrecision(5).padStart(9)} ${step.unit.padEnd(5)} ${step.formula ?? step.reason ?? step.name}`,
  )
}
print()
print(notices[0]?.text)
print(
  '`npm start` keeps the service up; then look at /v1/methods, /v1/sources, /v1/limits and /graphql/explorer on http://127.0.0.1:8080',
)
await app.close()
