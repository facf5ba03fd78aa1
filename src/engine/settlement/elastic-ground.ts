import { EngineFault, refuse } from '../faults.ts'
import { SAME_DEPTH, type Stratum, strata, stratumAt } from '../ground/depths.ts'
import { layerParameter } from '../ground/parameters.ts'
import type { GroundProfile } from '../ground/profile-types.ts'
import { layerBoundary } from '../ground/stress.ts'
import type { Notice } from '../notice.ts'
import type { SettlementMethod } from '../requests.ts'
import { practice, statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'

export const shearModulus = formula({
  symbol: 'G',
  name: 'shear modulus',
  unit: 'kPa',
  text: 'E / (2 * (1 + nu))',
  where: { E: 'kPa', nu: '1' },
  source: statics('isotropic elasticity'),
})
export const middle = formula({
  symbol: 'z',
  name: 'middle of the stretch',
  unit: 'm',
  text: '(z_t + z_b) / 2',
  where: { z_t: 'm', z_b: 'm' },
  source: statics('depths'),
})
export const weighted = formula({
  symbol: 'G_h',
  name: 'shear modulus times thickness',
  unit: 'kN/m',
  text: 'G * (z_b - z_t)',
  where: { G: 'kPa', z_b: 'm', z_t: 'm' },
  source: statics('mean'),
})

/**
 * Names every layer that matters and lacks its modulus, all at once: along the shaft and under the toe, for the continuum
 * also above the head and, over a rigid base, down to it.
 */
function demandModulus(
  layers: readonly Stratum[],
  profile: GroundProfile,
  reach: { head: number; toe: number },
  method: SettlementMethod,
  pointer: string,
): void {
  const under = stratumAt(layers, reach.toe)
  const whole = method === 'elastic-continuum'
  const bottom = whole && profile.rigidBase ? Number.POSITIVE_INFINITY : reach.toe
  const lacking = layers.filter(
    (s) =>
      s.layer.youngsModulus === undefined &&
      (s === under || Math.min(s.bottom, bottom) - Math.max(s.top, whole ? 0 : reach.head) > SAME_DEPTH),
  )
  const byIndex = new Map(lacking.map((s) => [s.index, s]))
  if (byIndex.size === 0) return
  throw new EngineFault(
    [...byIndex.values()].map((s) => ({
      pointer: `${pointer}/layers/${s.index}`,
      code: 'missing-parameter' as const,
      facts: { layer: s.layer.name, parameter: 'youngsModulus', method },
    })),
  )
}

export type Stiffness = { readonly E: Term<'kPa'>; readonly nu: Term<'1'>; readonly G: Term<'kPa'> }
export type ElasticGround = {
  /** Top down; a layer that is carried on stands a second time, below its own bottom. */
  readonly layers: readonly Stratum[]
  /** Stiffness at a depth within a stratum. */
  readonly at: (here: Sheet, stratum: Stratum, depth: Term<'m'>) => Stiffness
  /** Top and bottom of a stratum as steps. */
  readonly top: (index: number) => Term<'m'>
  readonly bottom: (index: number) => Term<'m'>
}

/** The elastic side of a ground profile. A last layer with a thickness is carried on, with a notice; it keeps the modulus of its bottom. */
export function elasticGround(
  root: Sheet,
  profile: GroundProfile,
  at: { readonly pile: string; readonly ground: string },
  reach: { readonly head: number; readonly toe: number },
  method: SettlementMethod,
  notice: (n: Notice) => void,
): ElasticGround {
  const pointer = at.ground
  const known = strata(profile, pointer)
  const last = known.at(-1)!
  const ends = Number.isFinite(last.bottom)
  if (profile.rigidBase && reach.toe > last.bottom + SAME_DEPTH)
    refuse('pile-below-known-ground', `${at.pile}/length`, {
      toeDepth: reach.toe,
      knownDepth: last.bottom,
      unit: 'm',
    })
  if (ends && !profile.rigidBase) {
    notice({
      code: 'ground-carried-on',
      level: reach.toe > last.bottom + SAME_DEPTH ? 'warning' : 'info',
      pointer: `${pointer}/layers/${last.index}`,
      text: `${last.layer.name} was carried on below ${last.bottom.toFixed(1)} m for the settlement.`,
    })
  }
  if (profile.rigidBase && method === 'randolph-wroth-1978') {
    notice({
      code: 'approximation',
      level: 'caution',
      pointer: `${pointer}/rigidBase`,
      text: 'randolph-wroth-1978 knows no rigid base: the settlement leaves out its restraint and is on the high side.',
    })
  }
  const carried: Stratum | undefined =
    ends && !profile.rigidBase ? { ...last, top: last.bottom, bottom: Number.POSITIVE_INFINITY } : undefined
  const layers = carried ? [...known, carried] : known
  demandModulus(layers, profile, reach, method, pointer)
  const sheet = root.within('ground')
  const surface = (): Term<'m'> =>
    sheet.assumed(
      { symbol: 'z_0', name: 'ground surface', unit: 'm' },
      0,
      'depth is counted from the surface',
      statics('datum'),
    )
  const bottom = (index: number): Term<'m'> => {
    const { layer } = known[index]!
    const z_t = index === 0 ? surface() : bottoms[index - 1]!
    const h = sheet.input(
      { symbol: 'h', name: 'layer thickness', unit: 'm' },
      layer.thickness!,
      `${pointer}/layers/${index}/thickness`,
      `${index}/h`,
    )
    return sheet.step(layerBoundary, { z_t, h }, `${index}/z_b`)
  }
  const bottoms: Term<'m'>[] = []
  for (const s of known) if (s.layer.thickness !== undefined) bottoms.push(bottom(s.index))
  return {
    layers,
    top: (index) => (index === 0 ? surface() : bottoms[index - 1]!),
    bottom: (index) => bottoms[index]!,
    at: (here, stratum, asked) => {
      const place = `${pointer}/layers/${stratum.index}`
      const beyond = stratum === carried
      const E = layerParameter(
        root,
        here,
        beyond ? last : stratum,
        place,
        beyond ? bottoms[last.index]! : asked,
        { name: 'youngsModulus', symbol: 'E', unit: 'kPa', method },
        undefined,
      )
      const label = { symbol: 'nu', name: `Poisson's ratio of ${stratum.layer.name}`, unit: '1' } as const
      const { poissonsRatio, soil } = stratum.layer
      const nu =
        poissonsRatio === undefined
          ? sheet.assumed(
              label,
              soil === 'cohesive' ? 0.5 : 0.3,
              `no poissonsRatio was given: ${soil}`,
              practice("Poisson's ratio, undrained clay 0.5, else 0.3"),
              `${stratum.index}/nu`,
            )
          : sheet.input(label, poissonsRatio, `${place}/poissonsRatio`, `${stratum.index}/nu`)
      return { E, nu, G: here.step(shearModulus, { E, nu }) }
    },
  }
}
