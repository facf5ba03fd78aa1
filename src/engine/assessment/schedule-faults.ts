import { limitStateFor } from '../design-basis/design-resistance.ts'
import { EngineFault, type Fault } from '../faults.ts'
import type { Schedule } from './schedule.ts'

/** Everything that a schedule refers to and does not hold, and limit states that do not fit; all faults together. */
export function refuseFaults(schedule: Schedule): void {
  const faults: Fault[] = []
  const fault = (code: Fault['code'], pointer: string, facts: Fault['facts']) => faults.push({ code, pointer, facts })
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
  for (const [i, row] of rows.entries()) {
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
  const wanted = Object.entries(combinations)
    .filter(([, c]) => c.limitState === needed)
    .map(([name]) => name)
  const present = new Set(rows.map((row) => `${row.cap}\n${row.combination}`))
  for (const [i, cap] of schedule.caps.entries()) {
    if (wanted.length > 0 && !wanted.some((name) => present.has(`${cap.mark}\n${name}`)))
      fault('missing-load', `/caps/${i}`, { cap: cap.mark, combination: wanted.join(', ') })
  }
  if (faults.length > 0) throw new EngineFault(faults)
}
