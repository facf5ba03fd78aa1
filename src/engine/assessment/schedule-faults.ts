import { limitStateFor } from '../design-basis/design-resistance.ts'
import { EngineFault, type Fault } from '../faults.ts'
import type { LimitState, Schedule } from './schedule.ts'

type Tell = (code: Fault['code'], pointer: string, facts: Fault['facts']) => void

/** Everything that a schedule refers to and does not hold, and limit states that do not fit; all faults together. */
export function refuseFaults(schedule: Schedule): void {
  const faults: Fault[] = []
  const fault: Tell = (code, pointer, facts) => faults.push({ code, pointer, facts })
  const marks = new Set<string>()
  for (const [i, cap] of schedule.caps.entries()) {
    if (marks.has(cap.mark)) fault('duplicate-mark', `/caps/${i}/mark`, { mark: cap.mark })
    marks.add(cap.mark)
    for (const [field, kind, known] of [
      ['ground', 'ground profile', schedule.ground],
      ['pileType', 'pile type', schedule.pileTypes],
    ] as const) {
      if (!Object.hasOwn(known, cap[field]))
        fault('unknown-reference', `/caps/${i}/${field}`, { kind, name: cap[field], known: Object.keys(known) })
    }
  }
  const { combinations, rows, signs } = schedule.loads
  const present = new Map<string, number>()
  for (const [i, row] of rows.entries()) {
    const place = placeOf(row.cap, row.combination)
    const first = present.get(place)
    if (first !== undefined)
      fault('duplicate-row', `/loads/rows/${i}`, { cap: row.cap, combination: row.combination, first: first + 1 })
    else present.set(place, i)
    if (!marks.has(row.cap))
      fault('unknown-reference', `/loads/rows/${i}/cap`, { kind: 'cap', name: row.cap, known: [...marks].slice(0, 20) })
    if (!Object.hasOwn(combinations, row.combination))
      fault('unknown-reference', `/loads/rows/${i}/combination`, {
        kind: 'combination',
        name: row.combination,
        known: Object.keys(combinations),
      })
    if ('V' in row !== (signs === 'pressing'))
      fault('wrong-load-components', `/loads/rows/${i}`, {
        signs,
        expected: signs === 'pressing' ? ['V', 'Mx', 'My'] : ['Fx', 'Fy', 'Fz', 'Mx', 'My', 'Mz'],
      })
  }
  const needed = limitStateFor(schedule.designBasis)
  const found = [...new Set(Object.values(combinations).map((c) => c.limitState))]
  if (!found.includes(needed)) {
    fault('limit-state-mismatch', '/loads/combinations', {
      needed,
      found,
      reason:
        needed === 'working'
          ? `An overall factor is checked with working (unfactored) combinations only; the schedule has ${found.join(', ') || 'none'}`
          : `Partial and resistance factors are checked with ultimate (factored) combinations only; the schedule has ${found.join(', ') || 'none'}`,
    })
  }
  for (const cap of capsWithout(schedule, present, [needed]))
    fault('missing-load', `/caps/${cap.index}`, { cap: cap.mark, combination: cap.wanted.join(', ') })
  serviceFaults(schedule, present, found, fault)
  if (faults.length > 0) throw new EngineFault(faults)
}

/** One key for both names: the length keeps `a` + `bc` apart from `ab` + `c`. */
const placeOf = (cap: string, combination: string) => `${cap.length} ${cap}${combination}`

/** Caps without a row in any combination of these limit states; none where the schedule has no such combination. */
function capsWithout({ caps, loads }: Schedule, present: ReadonlyMap<string, number>, states: readonly LimitState[]) {
  const wanted = Object.entries(loads.combinations)
    .filter(([, c]) => states.includes(c.limitState))
    .map(([name]) => name)
  if (wanted.length === 0) return []
  return caps.flatMap(({ mark }, index) =>
    wanted.some((name) => present.has(placeOf(mark, name))) ? [] : [{ mark, index, wanted }],
  )
}

/** A limit that nothing is checked against would read as satisfied. */
function serviceFaults(
  schedule: Schedule,
  present: ReadonlyMap<string, number>,
  found: readonly LimitState[],
  fault: Tell,
) {
  const limits = Object.values(schedule.limits ?? {}).filter((limit) => limit !== undefined)
  // Working combinations serve here too: where the design basis demands them, their absence is told once, there.
  if (limits.length === 0 || limitStateFor(schedule.designBasis) === 'working') return
  const states: readonly LimitState[] = ['serviceability', 'working']
  if (!states.some((state) => found.includes(state))) {
    fault('limit-state-mismatch', '/limits', {
      needed: 'serviceability',
      found,
      reason: `Settlement, tilt and angular distortion are checked with serviceability combinations, or with working ones where there are none; the schedule has ${found.join(', ') || 'none'}`,
    })
  }
  for (const cap of capsWithout(schedule, present, states))
    fault('missing-load', `/caps/${cap.index}`, { cap: cap.mark, combination: cap.wanted.join(', ') })
}
