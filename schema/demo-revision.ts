import type { Schemas } from './client.ts'

/** The demo's second week: what moved in the model, and how its changes are told to a checker. Invented, like all of the demo. */

type Profile = { layers: { name: string; thickness?: number }[] }
export type Demo = { title: string; ground: Record<string, Profile> }

/** Three reactions of the model, kN and kN.m. */
const reactions = [
  { cap: 'A3', combination: 'W1', column: 'Fz', value: 4100 },
  { cap: 'C2', combination: 'W2', column: 'My', value: 20 },
  { cap: 'C4', combination: 'W1', column: 'Fz', value: 3050 },
]

/** The loads of the second week; throws where a row is missing. */
export function movedLoads(csv: string): string {
  const lines = csv.trimEnd().split(/\r?\n/)
  const columns = lines[0]!.split(',')
  for (const { cap, combination, column, value } of reactions) {
    const at = lines.findIndex((line) => line.startsWith(`${cap},${combination},`))
    if (at < 0) throw new Error(`no row ${cap}, ${combination}`)
    const cells = lines[at]!.split(',')
    cells[columns.indexOf(column)] = String(value)
    lines[at] = cells.join(',')
  }
  return `${lines.join('\n')}\n`
}

/** A boring beside BH2 met the soft clay one metre deeper. */
export function movedGround<S extends Demo>(schedule: S): S {
  const moved = structuredClone(schedule)
  const [soft] = moved.ground.BH2!.layers
  soft!.thickness! += 1
  return moved
}

type Changes = Schemas['ChangesReply']
type Sides = { readonly before?: { readonly utilisation: number }; readonly after?: { readonly utilisation: number } }

const use = (value: { readonly utilisation: number } | undefined) => value?.utilisation.toFixed(2) ?? 'none'
const moved = ({ before, after }: Sides) => `${use(before)} -> ${use(after)}`

/** The changes in a few lines, in the order in which the service tells them. */
export function tellChanges({ before, after, verdicts, caps, inputs }: Changes): string[] {
  const changed = inputs.map(({ part, name, combination, layer, field, by, unit, ...sides }) => {
    const byMuch = by === undefined ? '' : `  (${by > 0 ? '+' : ''}${+by.toPrecision(6)} ${unit ?? ''})`
    const place = [name, combination, layer].filter(Boolean).join(', ')
    return `  ${part.padEnd(9)} ${place}: ${field} ${JSON.stringify(sides.before)} -> ${JSON.stringify(sides.after)}${byMuch}`
  })
  const turned = verdicts.map((verdict) => {
    const where = verdict.cap ?? `${verdict.a} to ${verdict.b}`
    return `  ${where.padEnd(9)} ${verdict.check}: now ${verdict.turned}, ${moved(verdict)}`
  })
  const others = caps.filter((cap) => cap.turned === undefined)
  const governing = others.map((cap) => {
    const { after: now } = cap.governing
    const what = cap.governingChanged ? `now governed by ${now?.check}, ${now?.combination}` : `still ${now?.check}`
    return `  ${cap.mark.padEnd(9)} ${moved(cap.governing)}, ${what}`
  })
  return [
    `Revision ${after.revision} against revision ${before.revision}:`,
    `Verdicts that turned (${turned.length}):`,
    ...turned,
    `Other caps whose figures moved (${others.length}):`,
    ...governing,
    `Changed in the schedule (${inputs.length}):`,
    ...changed,
  ]
}
