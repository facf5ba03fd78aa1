import { refuse } from '../faults.ts'
import { SAME_DEPTH, type Stratum, strata } from '../ground/depths.ts'
import { layerParameter } from '../ground/parameters.ts'
import type { GroundProfile } from '../ground/profile-types.ts'
import { layerBoundary } from '../ground/stress.ts'
import type { Notice } from '../notice.ts'
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

export type Stiffness = { readonly E: Term<'kPa'>; readonly nu: Term<'1'>; readonly G: Term<'kPa'> }
export type ElasticGround = {
  readonly layers: readonly Stratum[]
  /** Stiffness at a depth within a stratum. */
  readonly at: (here: Sheet, stratum: Stratum, depth: Term<'m'>) => Stiffness
  /** Bottom of a stratum as a step. */
  readonly bottom: (index: number) => Term<'m'>
}

/** The elastic side of a ground profile. A last layer with a thickness is carried on, with a notice. */
export function elasticGround(
  root: Sheet,
  profile: GroundProfile,
  pointer: string,
  toe: number,
  notice: (n: Notice) => void,
): ElasticGround {
  const known = strata(profile, pointer)
  const last = known.at(-1)!
  if (toe > last.bottom + SAME_DEPTH)
    refuse('pile-below-known-ground', '/pile/length', { toeDepth: toe, knownDepth: last.bottom, unit: 'm' })
  if (Number.isFinite(last.bottom) && !profile.rigidBase) {
    notice({
      code: 'ground-carried-on',
      level: 'info',
      pointer: `${pointer}/layers/${last.index}`,
      text: `${last.layer.name} was carried on below ${last.bottom.toFixed(1)} m for the settlement.`,
    })
  }
  const layers = profile.rigidBase
    ? known
    : known.map((s) => (s === last ? { ...s, bottom: Number.POSITIVE_INFINITY } : s))
  const sheet = root.within('ground')
  const bottom = (index: number): Term<'m'> => {
    const { layer } = known[index]!
    const z_t =
      index === 0
        ? sheet.assumed(
            { symbol: 'z_0', name: 'ground surface', unit: 'm' },
            0,
            'depth is counted from the surface',
            statics('datum'),
          )
        : bottoms[index - 1]!
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
    bottom: (index) => bottoms[index]!,
    at: (here, stratum, depth) => {
      const at = `${pointer}/layers/${stratum.index}`
      const E = layerParameter(
        root,
        here,
        stratum,
        at,
        depth,
        { name: 'youngsModulus', symbol: 'E', unit: 'kPa', method: 'randolph-wroth-1978' },
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
          : sheet.input(label, poissonsRatio, `${at}/poissonsRatio`, `${stratum.index}/nu`)
      return { E, nu, G: here.step(shearModulus, { E, nu }) }
    },
  }
}
