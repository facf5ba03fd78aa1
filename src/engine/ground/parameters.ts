import { refuse } from '../faults.ts'
import type { UnitCode } from '../quantities/units.ts'
import { cite, practice } from '../sources/bibliography.ts'
import { type Formula, formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { Stratum } from './depths.ts'
import type { Varying } from './profile-types.ts'
import { layerTop } from './stress.ts'

const linear = <const U extends UnitCode>(unit: U) =>
  formula({
    symbol: 'p',
    name: 'parameter at depth',
    unit,
    text: 'p_t + (p_b - p_t) * (z - z_t) / h',
    where: { p_t: unit, p_b: unit, z: 'm', z_t: 'm', h: 'm' },
    source: practice('linear with depth between the given values'),
  })
const linearIn: Partial<Record<UnitCode, Formula>> = { kPa: linear('kPa') as unknown as Formula }

export const factoredStrength = formula({
  symbol: 'c_ud',
  name: 'design undrained shear strength',
  unit: 'kPa',
  text: 'c_u / gamma_cu',
  where: { c_u: 'kPa', gamma_cu: '1' },
  source: cite('en-1997-1-2004', '2.4.6.2, table A.4'),
})
export const factoredAngle = formula({
  symbol: 'phi_d',
  name: 'design friction angle',
  unit: 'deg',
  text: 'atan(tan(phi) / gamma_phi)',
  where: { phi: 'deg', gamma_phi: '1' },
  source: cite('en-1997-1-2004', '2.4.6.2, table A.4'),
})

/** Partial factors on the ground (EN 1997-1 DA3); undefined: none. */
export type MaterialFactors = { readonly cu: number; readonly tanPhi: number }

type Ask<U extends UnitCode> = {
  readonly name: string
  readonly symbol: string
  readonly unit: U
  readonly method: string
}

/**
 * A parameter of a layer at a depth: the request's value, or linear between its top and bottom.
 * Refuses a missing one, naming layer, parameter and method. `here` is the sheet of the place, `root` that of the profile.
 */
export function layerParameter<const U extends UnitCode>(
  root: Sheet,
  here: Sheet,
  stratum: Stratum,
  pointer: string,
  depth: Term<'m'>,
  ask: Ask<U>,
  factors: MaterialFactors | undefined,
): Term<U> {
  const { layer, index } = stratum
  const given = (layer as unknown as Record<string, Varying | undefined>)[ask.name]
  if (given === undefined)
    return refuse('missing-parameter', pointer, { layer: layer.name, parameter: ask.name, method: ask.method })
  const ground = root.within('ground')
  const at = `${pointer}/${ask.name}`
  const label = { symbol: ask.symbol, name: `${ask.name} of ${layer.name}`, unit: ask.unit }
  if (typeof given === 'number')
    return factored(here, ground.input(label, given, at, `${index}/${ask.name}`), ask, factors)
  if (layer.thickness === undefined)
    return refuse('missing-thickness', pointer, { layer: layer.name, parameter: ask.name })
  const f = linearIn[ask.unit]
  if (!f) return refuse('wrong-dimension', at, { field: ask.name, expected: ask.unit })
  const terms = {
    p_t: ground.input({ ...label, symbol: `${ask.symbol}_t` }, given.top, `${at}/top`, `${index}/${ask.name}/top`),
    p_b: ground.input(
      { ...label, symbol: `${ask.symbol}_b` },
      given.bottom,
      `${at}/bottom`,
      `${index}/${ask.name}/bottom`,
    ),
    z: depth,
    z_t: layerTop(ground, index, stratum),
    h: ground.input(
      { symbol: 'h', name: 'layer thickness', unit: 'm' },
      layer.thickness,
      `${pointer}/thickness`,
      `${index}/h`,
    ),
  }
  const value = here.step(f, terms, ask.symbol) as Term<U>
  return factored(here, { ...value, symbol: ask.symbol }, ask, factors)
}

function factored<U extends UnitCode>(
  here: Sheet,
  value: Term<U>,
  ask: Ask<U>,
  factors: MaterialFactors | undefined,
): Term<U> {
  if (!factors) return value
  const source = cite('en-1997-1-2004', 'table A.4, set M2')
  if (ask.name === 'undrainedShearStrength') {
    const gamma_cu = here.assumed(
      { symbol: 'gamma_cu', name: 'partial factor on c_u', unit: '1' },
      factors.cu,
      'design approach 3 factors the ground',
      source,
    )
    return here.step(factoredStrength, { c_u: value as Term<'kPa'>, gamma_cu }) as Term as Term<U>
  }
  if (ask.name === 'frictionAngle' || ask.name === 'effectiveFrictionAngle') {
    const gamma_phi = here.assumed(
      { symbol: 'gamma_phi', name: 'partial factor on tan phi', unit: '1' },
      factors.tanPhi,
      'design approach 3 factors the ground',
      source,
    )
    return here.step(factoredAngle, { phi: value as Term<'deg'>, gamma_phi }) as Term as Term<U>
  }
  return value
}
