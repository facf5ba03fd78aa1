import type { Installation } from '../piles/pile-type.ts'
import { cite } from '../sources/bibliography.ts'
import type { En1997Approach } from './design-basis.ts'

type Row = { readonly base: number; readonly shaft: number; readonly total: number; readonly tension: number }
type Set = Readonly<Record<Installation, Row>>
const same = (row: Row): Set => ({ driven: row, bored: row, 'continuous-flight-auger': row })

/** Recommended resistance factors of EN 1997-1:2004 Annex A, tables A.6 to A.8. */
export const resistanceFactors: Readonly<Record<'R1' | 'R2' | 'R3' | 'R4', Set>> = {
  R1: {
    driven: { base: 1.0, shaft: 1.0, total: 1.0, tension: 1.25 },
    bored: { base: 1.25, shaft: 1.0, total: 1.15, tension: 1.25 },
    'continuous-flight-auger': { base: 1.1, shaft: 1.0, total: 1.1, tension: 1.25 },
  },
  R2: same({ base: 1.1, shaft: 1.1, total: 1.1, tension: 1.15 }),
  R3: same({ base: 1.0, shaft: 1.0, total: 1.0, tension: 1.1 }),
  R4: {
    driven: { base: 1.3, shaft: 1.3, total: 1.3, tension: 1.6 },
    bored: { base: 1.6, shaft: 1.3, total: 1.5, tension: 1.6 },
    'continuous-flight-auger': { base: 1.45, shaft: 1.3, total: 1.4, tension: 1.6 },
  },
}

/** Factors on unfavourable and favourable actions of table A.3. For those who factor the loads: ultimate combinations arrive factored. */
export const actionFactors = {
  A1: { permanent: 1.35, favourable: 1.0, variable: 1.5 },
  A2: { permanent: 1.0, favourable: 1.0, variable: 1.3 },
} as const

/** The set that each approach applies to pile resistance. */
export const setOf: Readonly<Record<En1997Approach, keyof typeof resistanceFactors>> = {
  'DA1-1': 'R1',
  'DA1-2': 'R4',
  DA2: 'R2',
  DA3: 'R3',
}

/** Ground factors M2 of table A.4, applied by design approach 3. */
export const groundFactors = { cu: 1.4, tanPhi: 1.25 } as const

/** Correlation factors xi3 and xi4 by number of test profiles, table A.10. */
export const correlationFactors: readonly (readonly [count: number, xi3: number, xi4: number])[] = [
  [1, 1.4, 1.4],
  [2, 1.35, 1.27],
  [3, 1.33, 1.23],
  [4, 1.31, 1.2],
  [5, 1.29, 1.15],
  [7, 1.27, 1.12],
  [10, 1.25, 1.08],
]

/** Of xi3 and xi4, not below 1, where the structure transfers load from weak to strong piles: 7.6.2.3(7). */
export const stiffStructureDivisor = 1.1

export const enTable = (locator: string) => cite('en-1997-1-2004', locator)
