import { cpus } from 'node:os'
import { type Finding, sink } from './measure.ts'

/** Run with `npm run bench`, or with letters for some parts: `npm run bench -- b c`. Each part is loaded alone, so that none warms up another. */
const parts: Readonly<Record<string, () => Promise<readonly Finding[]>>> = {
  a: async () => (await import('./trace-over-http.ts')).traceOverHttp(),
  b: async () => (await import('./trace-cost.ts')).traceCost(),
  c: async () => (await import('./assessment-cost.ts')).assessmentCost(),
  d: async () => (await import('./formula-step.ts')).formulaStep(),
  h: async () => (await import('./continuum.ts')).continuum(),
  e: async () => [
    ...(await (await import('./probe-under-load.ts')).probeUnderLoad()),
    ...(await (await import('./overload.ts')).overload()),
  ],
  f: async () => (await import('./records.ts')).records(),
  g: async () => (await import('./dashboards.ts')).dashboards(),
  i: async () => (await import('./pages.ts')).pages(),
}

const print = (line: string) => process.stdout.write(`${line}\n`)
const wanted = process.argv.slice(2)
for (const name of wanted) if (!Object.hasOwn(parts, name)) throw new Error(`no part ${name}; ${Object.keys(parts)}`)

print(`Node ${process.version}, ${cpus().length} x ${cpus()[0]?.model ?? 'unknown processor'}\n`)
print(`   ${'what'.padEnd(58)} ${'found'.padEnd(44)} ${'aim'.padEnd(10)} verdict`)
let missed = 0
for (const [name, part] of Object.entries(parts)) {
  if (wanted.length > 0 && !wanted.includes(name)) continue
  for (const { part: letter, what, value, aim = '', holds } of await part()) {
    const verdict = holds === undefined ? '' : holds ? 'met' : 'MISSED'
    if (holds === false) missed++
    print(`${letter}  ${what.padEnd(58)} ${value.padEnd(44)} ${aim.padEnd(10)} ${verdict}`)
  }
}
print(
  `\n${missed === 0 ? 'every aim met' : `${missed} aim(s) missed`}; sum of what was computed ${sink.sum.toExponential(6)}`,
)
