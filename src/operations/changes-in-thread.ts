import { move } from 'piscina'
import { unitOf } from '../contract/field-units.ts'
import { type Assessed, type Changes, changes } from '../engine/index.ts'
import { outcomeOf, type Work } from '../jobs/pool.ts'
import { unpack } from '../store/blobs.ts'
import type { ShownRecord } from './show-record.ts'

/** The stored parts of a record that are compared. */
export type Compared = {
  readonly request: Uint8Array
  readonly outcome: Uint8Array
  readonly caps: readonly Uint8Array[]
}
export type CompareTask = {
  readonly before: Compared
  readonly after: Compared
  /** So many of each list are told; the counts tell of all. */
  readonly most: number
  /** The two records, as the answer shows them. */
  readonly heads: { readonly before: ShownRecord; readonly after: ShownRecord }
}

const assessed = ({ request, outcome, caps }: Compared): Assessed => ({
  schedule: JSON.parse(unpack(request)),
  result: { caps: caps.map((cap) => JSON.parse(unpack(cap))), ...JSON.parse(unpack(outcome)) },
})

type Input = Changes['inputs'][number]
/** A number of a schedule with the unit of its field. */
function withUnit(input: Input): Input & { readonly unit?: string } {
  const isNumber = typeof (input.after ?? input.before) === 'number'
  const unit = isNumber ? unitOf(input.pointer.after ?? input.pointer.before!) : undefined
  return unit === undefined ? input : { ...input, unit }
}

export type ToldChanges = CompareTask['heads'] &
  Omit<Changes, 'inputs'> & { readonly inputs: readonly ReturnType<typeof withUnit>[] }

function told({ before, after, most, heads }: CompareTask): ToldChanges {
  const { counts, verdicts, caps, added, gone, neighbours, inputs } = changes(assessed(before), assessed(after))
  const cut = <T>(list: readonly T[]) => list.slice(0, most)
  return {
    ...heads,
    counts,
    verdicts: cut(verdicts),
    caps: cut(caps),
    added: cut(added),
    gone: cut(gone),
    neighbours: cut(neighbours),
    inputs: cut(inputs).map(withUnit),
  }
}

/** The entry of a worker thread: a large schedule has half a million rows. Gives JSON. */
export const changesInThread = (task: CompareTask) =>
  outcomeOf(() => move(new TextEncoder().encode(JSON.stringify(told(task)))) as Uint8Array)

export const comparing: Work<CompareTask, Uint8Array> = { entry: new URL(import.meta.url), name: 'changesInThread' }
