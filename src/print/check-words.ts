import type { UnitCode } from '../engine/quantities/units.ts'
import type { CheckResult } from './record.ts'

export type CheckKind = CheckResult['check']

/** Every check in words, with the unit of its demand. */
export const checkWords: Readonly<Record<CheckKind, { readonly name: string; readonly unit: UnitCode }>> = {
  'pile-compression': { name: 'pile in compression', unit: 'kN' },
  'pile-uplift': { name: 'pile in uplift', unit: 'kN' },
  'group-compression': { name: 'sum of the piles in compression', unit: 'kN' },
  'block-compression': { name: 'block in compression', unit: 'kN' },
  'group-uplift': { name: 'sum of the piles in uplift', unit: 'kN' },
  'block-uplift': { name: 'block in uplift', unit: 'kN' },
  'pile-section': { name: 'section of the pile', unit: 'kN' },
  settlement: { name: 'settlement', unit: 'mm' },
  tilt: { name: 'tilt', unit: '1' },
}
