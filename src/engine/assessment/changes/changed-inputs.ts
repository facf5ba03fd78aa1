import { escapePointer } from '../places.ts'
import type { Cap, Loads, Schedule } from '../schedule.ts'
import { changedGround } from './changed-ground.ts'
import { type Leaf, leaf, leaves } from './leaves.ts'

/** Parts of a schedule, in the order in which their changes are told. */
export const changedParts = [
  'reaction',
  'combination',
  'signs',
  'ground',
  'pile-type',
  'cap',
  'layout',
  'limit',
  'method',
  'design-basis',
  'title',
] as const
export type ChangedPart = (typeof changedParts)[number]

/** One value of the schedule that changed. */
export type InputChange = Leaf & {
  readonly part: ChangedPart
  /** Mark of the cap, name of the profile, pile type or combination; empty for what belongs to the whole schedule. */
  readonly name: string
  readonly combination?: string
  readonly layer?: string
}

type Named<V> = Readonly<Record<string, V>>

function* byName<V>(
  part: ChangedPart,
  place: string,
  before: Named<V>,
  after: Named<V>,
  compare: (before: V, after: V, pointer: string) => Iterable<Leaf>,
): Generator<InputChange> {
  for (const name of new Set([...Object.keys(before), ...Object.keys(after)])) {
    const pointer = `${place}/${escapePointer(name)}`
    const [a, b] = [before, after].map((all) => (Object.hasOwn(all, name) ? all[name] : undefined))
    if (a !== undefined && b !== undefined) for (const found of compare(a, b, pointer)) yield { part, name, ...found }
    else yield { part, name, ...leaf({ before: pointer, after: pointer }, '', a, b) }
  }
}
const byLeaves = (before: unknown, after: unknown, pointer: string) =>
  leaves(before, after, { before: pointer, after: pointer })

/** Pairs of what stands in both lists or in one, by a key that each list holds once; in the order of after, then what is gone. */
export function pairsBy<V>(before: readonly V[], after: readonly V[], keyOf: (value: V) => string) {
  const places = new Map(before.map((value, index) => [keyOf(value), { value, index }]))
  const pairs = after.map((value, index) => {
    const found = places.get(keyOf(value))
    places.delete(keyOf(value))
    return { before: found, after: { value, index } }
  })
  return [...pairs, ...[...places.values()].map((gone) => ({ before: gone, after: undefined }))]
}

/** Rows by cap and combination. Those of caps that were added or are gone are told with the cap. */
function* reactions(before: Loads, after: Loads, stays: (mark: string) => boolean): Generator<InputChange> {
  const key = (row: { cap: string; combination: string }) => JSON.stringify([row.cap, row.combination])
  for (const pair of pairsBy<Loads['rows'][number]>(before.rows, after.rows, key)) {
    const { cap: name, combination } = (pair.after ?? pair.before)!.value
    if (!stays(name)) continue
    const at = (index: number | undefined) => `/loads/rows/${index}`
    const pointer = { before: at(pair.before?.index), after: at(pair.after?.index) }
    const found =
      pair.before && pair.after
        ? leaves(pair.before.value, pair.after.value, pointer)
        : [leaf(pointer, '', pair.before?.value, pair.after?.value)]
    for (const one of found) yield { part: 'reaction', name, combination, ...one }
  }
}

function* caps(before: readonly Cap[], after: readonly Cap[]): Generator<InputChange> {
  for (const pair of pairsBy<Cap>(before, after, (cap) => cap.mark)) {
    if (!pair.before || !pair.after) continue
    const pointer = { before: `/caps/${pair.before.index}`, after: `/caps/${pair.after.index}` }
    for (const found of leaves(pair.before.value, pair.after.value, pointer)) {
      const part = /^layout(\/|$)/.test(found.field) ? 'layout' : 'cap'
      yield { part, name: pair.after.value.mark, ...found }
    }
  }
}

/** Every value that two schedules do not share, but for caps that were added or are gone. */
export function changedInputs(before: Schedule, after: Schedule): InputChange[] {
  const marks = [before, after].map((schedule) => new Set(schedule.caps.map((cap) => cap.mark)))
  const stays = (mark: string) => marks.every((all) => all.has(mark))
  const whole = function* (part: ChangedPart, pointer: string, a: unknown, b: unknown): Generator<InputChange> {
    for (const found of byLeaves(a, b, pointer)) yield { part, name: '', ...found }
  }
  const signs = ({ signs, loadsAre }: Loads) => ({ signs, loadsAre })
  const found = [
    ...reactions(before.loads, after.loads, stays),
    ...byName('combination', '/loads/combinations', before.loads.combinations, after.loads.combinations, byLeaves),
    ...whole('signs', '/loads', signs(before.loads), signs(after.loads)),
    ...byName('ground', '/ground', before.ground, after.ground, changedGround),
    ...byName('pile-type', '/pileTypes', before.pileTypes, after.pileTypes, byLeaves),
    ...caps(before.caps, after.caps),
    ...whole('limit', '/limits', before.limits ?? {}, after.limits ?? {}),
    ...whole('method', '/methods', before.methods ?? {}, after.methods ?? {}),
    ...whole('method', '/settlementMethod', before.settlementMethod, after.settlementMethod),
    ...whole('design-basis', '/designBasis', before.designBasis, after.designBasis),
    ...whole('title', '/title', before.title, after.title),
  ]
  return found.sort((a, b) => changedParts.indexOf(a.part) - changedParts.indexOf(b.part))
}
