import { refuse } from '../faults.ts'
import type { UnitCode } from '../quantities/units.ts'
import { cite } from '../sources/bibliography.ts'
import type { Term } from '../trace/term.ts'
import type { MethodContext, Parameter } from './method.ts'

/** RP 2GEO table 1, loosest first: shaft factor, its limit kPa, N_q, base limit kPa. The silty soils stand one class lower. */
export const rp2geoClasses = [
  { name: 'medium dense, silty', beta: 0.29, shaftLimit: 67, bearing: 12, baseLimit: 3000 },
  { name: 'medium dense', beta: 0.37, shaftLimit: 81, bearing: 20, baseLimit: 5000 },
  { name: 'dense', beta: 0.46, shaftLimit: 96, bearing: 40, baseLimit: 10000 },
  { name: 'very dense', beta: 0.56, shaftLimit: 115, bearing: 50, baseLimit: 12000 },
] as const
type Row = (typeof rp2geoClasses)[number]

/** Relative density in percent at which each class begins. */
const CLASSES = [
  { from: 85, row: 3 },
  { from: 65, row: 2 },
  { from: 35, row: 1 },
] as const

export const siltyParameter: Readonly<Record<string, Parameter>> = {
  silty: { symbol: 's', name: 'sand-silt (1) instead of sand (0)', unit: '1', min: 0, max: 1, required: false },
}

/** The class of a layer from its relative density. Refuses loose soil, which the table does not cover. */
export function rp2geoClass(at: MethodContext): {
  row: Row
  read: <U extends UnitCode>(field: Exclude<keyof Row, 'name'>, symbol: string, name: string, unit: U) => Term<U>
} {
  const density = at.parameter('relativeDensity', 'D_r', '1').value
  const found = CLASSES.find((c) => density >= c.from)
  if (!found)
    return refuse('method-not-applicable', `${at.pointer}/relativeDensity`, {
      method: 'rp2geo-2011',
      layer: at.layer.name,
      got: density,
      limit: 35,
      unit: '%',
      reason: `Layer "${at.layer.name}" has a relative density of ${density} %, and the table of rp2geo-2011 begins at 35 %, medium dense`,
    })
  const silty = at.setting('silty', 's', '1')?.value === 1
  const row = rp2geoClasses[found.row - (silty ? 1 : 0)]!
  return {
    row,
    read: (field, symbol, name, unit) =>
      at.sheet.assumed(
        { symbol, name, unit },
        row[field],
        `class ${row.name} by a relative density of ${density} %`,
        cite('api-rp2geo-2011', 'table 1'),
      ),
  }
}
