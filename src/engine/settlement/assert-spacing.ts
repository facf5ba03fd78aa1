import { refuse } from '../faults.ts'
import type { PileResponse } from './pile-response.ts'

/** Axis to axis suffices between piles from so many diameters on (0.0003 of the interaction factor at 2.5, 0.003 at 1.5). */
const LEAST = 1.5

/** Refuses piles that stand closer than the method can answer for. */
export function assertSpacing({ elements, width }: PileResponse, spacing: number, pointer: string): void {
  const limit = LEAST * width.value
  if (elements && spacing < limit - 1e-9)
    refuse('piles-too-close', pointer, { spacing, limit, unit: 'm', method: 'elastic-continuum' })
}
