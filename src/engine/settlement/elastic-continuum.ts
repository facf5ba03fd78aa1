import { SAME_DEPTH } from '../ground/depths.ts'
import type { GroundProfile } from '../ground/profile-types.ts'
import type { Notice } from '../notice.ts'
import type { PileType } from '../piles/pile-type.ts'
import { cite, statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import { continuumProfile } from './continuum/continuum-profile.ts'
import { CoupledPiles } from './continuum/coupled-piles.ts'
import type { ElasticPile, ElasticProfile } from './continuum/elastic-profile.ts'
import { type InteractionCurve, interactionCurve } from './continuum/interaction-curve.ts'
import { remembered } from './continuum/remembered.ts'
import { type SolvedPile, solvePile } from './continuum/single-pile.ts'
import { elasticGround } from './elastic-ground.ts'
import { elasticPileTerms } from './pile-geometry.ts'
import type { PileResponse, SettlementPlaces } from './pile-response.ts'

const METHOD = 'elastic-continuum'
const SOLVE = 'boundary elements along the pile in a layered elastic half-space; Cholesky'
const PAIR = 'two equal piles, equally loaded, in the same ground; cubic spline of s times alpha over ln s'
const TOLERANCE = 1e-9

export const axialStiffness = formula({
  symbol: 'EA',
  name: 'axial stiffness of the pile',
  unit: 'kN',
  text: 'E_p * A',
  where: { E_p: 'kPa', A: 'm2' },
  source: statics('elastic bar'),
})

type Continuum = { readonly solved: SolvedPile; readonly curve: () => InteractionCurve }

/** A pile in a ground, solved when it is first asked for. */
function continuum(pile: ElasticPile, profile: ElasticProfile): Continuum {
  return remembered({ pile, profile }, () => {
    const solved = solvePile(pile, profile)
    let curve: InteractionCurve | undefined
    return {
      solved,
      curve: () => {
        curve ??= interactionCurve(solved)
        return curve
      },
    }
  })
}

/**
 * Stiffness of one pile, and its interaction with equal ones, on a layered elastic continuum: exact in the layers, within 2 % of finite
 * elements (5 % for a toe on ground 50 times stiffer than along the shaft). Neglects slip (see `nonlinearity`), the pile's own radial stiffness
 * and the volume that it fills.
 */
export function elasticContinuum(
  sheet: Sheet,
  pile: PileType,
  ground: GroundProfile,
  at: SettlementPlaces,
  notice: (n: Notice) => void,
): PileResponse {
  const { section, L, z_h, D, E_p, r_0, r_b } = elasticPileTerms(sheet, pile, at.pile)
  const elastic = elasticGround(sheet, ground, at, { head: z_h.value, toe: D.value }, METHOD, notice)
  const here = sheet.within('stiffness')
  const EA = here.step(axialStiffness, { E_p, A: section.material })
  const { profile, terms } = continuumProfile(here.within('layers'), elastic, ground, D.value, at.ground, notice)
  const { solved, curve } = continuum(
    { head: z_h.value, toe: D.value, radius: r_0.value, baseRadius: r_b.value, axialStiffness: EA.value },
    profile,
  )
  const { forces, stiffness } = solved
  const source = cite('mindlin-1936', 'layered half-space by transfer in the wavenumber domain')
  const operands = [L, z_h, D, r_0, r_b, EA, ...terms]
  const unknowns = Array.from(forces, (value, i) => ({
    symbol: i === forces.length - 1 ? 'q_b' : `q_${i + 1}`,
    value,
    unit: 'kN/m' as const,
  }))
  const residuals = [{ name: 'compatibility: largest departure from a unit settlement', value: solved.compatibility }]
  const solution = {
    method: SOLVE,
    operands,
    residuals,
    tolerance: TOLERANCE,
    mesh: Array.from(solved.soil.mesh.edges),
    source,
  }
  const k = here.solution({
    ...solution,
    symbol: 'k',
    name: 'stiffness of the pile head: sum of the element forces for a unit settlement',
    unit: 'kN/m',
    value: stiffness,
    unknowns,
  })
  const share = here.solution({
    ...solution,
    symbol: 'beta_b',
    name: 'share of the load at the base',
    unit: '1',
    value: forces.at(-1)! / stiffness,
    operands: [k],
    unknowns: unknowns.slice(-1),
  })
  const toeIn = elastic.layers.find((s) => D.value <= s.bottom + SAME_DEPTH) ?? elastic.layers.at(-1)!
  return {
    stiffness: k,
    baseLoadShare: share,
    width: section.width,
    toeModulus: elastic.at(here.within('toe'), toeIn, D).E,
    interaction: (s) => curve().at(s),
    basis: (group, spacing) => {
      const { spacings, alpha, at: factorAt } = curve()
      const value = factorAt(spacing)
      return [
        k,
        group.solution({
          ...solution,
          symbol: 'alpha',
          name: `interaction factor of two piles at the smallest spacing, ${spacing.toFixed(3)} m`,
          unit: '1',
          value,
          method: PAIR,
          operands: [k],
          unknowns: [{ symbol: 'alpha', value, unit: '1' }],
          table: {
            columns: [
              { symbol: 's', unit: 'm' },
              { symbol: 'alpha', unit: '1' },
            ],
            rows: Array.from(spacings, (s, i) => [s, alpha[i]!]),
          },
        }),
      ]
    },
    source,
    elements: { solved, radius: r_0, coupled: (points) => new CoupledPiles(solved, points) },
  }
}
