import { limitStateFor } from '../design-basis/design-resistance.ts'
import type { Notice } from '../notice.ts'
import { plainTexts } from '../trace/plain-string.ts'
import type { Row } from './assess-cap.ts'
import type { Schedule } from './schedule.ts'

/** Combinations of the checked limit states that some cap has a row for. */
export function checkedCombinations({ designBasis, loads }: Schedule): readonly string[] {
  const strength = limitStateFor(designBasis)
  const used = new Set(loads.rows.map((row) => row.combination))
  return Object.entries(loads.combinations)
    .filter(([name, { limitState }]) => used.has(name) && (limitState === strength || limitState === 'serviceability'))
    .map(([name]) => name)
}

/** A cap that was not exported with a combination that others have: nothing is checked there, and nothing else tells. */
export function missingCombinations(
  checked: readonly string[],
  mark: string,
  index: number,
  rows: readonly Row[],
): readonly Notice[] {
  const own = new Set(rows.map((r) => r.row.combination))
  const missing = checked.filter((name) => !own.has(name))
  if (missing.length === 0) return []
  const notice: Notice = {
    code: 'missing-combinations',
    level: 'warning',
    text: `Cap "${mark}" has no row for ${missing.join(', ')}, which other caps have; it was not checked under ${missing.length === 1 ? 'this combination' : 'these combinations'}.`,
    pointer: `/caps/${index}`,
  }
  return [plainTexts(notice)]
}

/** Components that the axial design leaves out, once for a schedule in which they are not zero. */
export function unusedComponents({ loads }: Schedule): readonly Notice[] {
  const unused = (['Fx', 'Fy', 'Mz'] as const).filter((component) =>
    loads.rows.some((row) => 'Fz' in row && row[component] !== 0),
  )
  if (unused.length === 0) return []
  const notice: Notice = {
    code: 'loads-not-used',
    level: 'caution',
    text: `The axial design does not use ${unused.join(', ')}: horizontal loads and the torsional moment of the caps are left for another proof.`,
    pointer: '/loads/rows',
  }
  return [plainTexts(notice)]
}
