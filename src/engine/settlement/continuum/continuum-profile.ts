import { SAME_DEPTH, type Stratum } from '../../ground/depths.ts'
import type { GroundProfile } from '../../ground/profile-types.ts'
import type { Notice } from '../../notice.ts'
import type { Sheet } from '../../trace/sheet.ts'
import type { Term } from '../../trace/term.ts'
import type { ElasticGround } from '../elastic-ground.ts'
import type { ElasticLayer, ElasticProfile } from './elastic-profile.ts'

/** Elastic layers as bare numbers, with the terms that they came from. */
export type ContinuumProfile = { readonly profile: ElasticProfile; readonly terms: readonly Term[] }

/** Reads every layer of the ground. Deeper ones without a modulus, all below the layer under the toe, are taken like the last that has one. */
export function continuumProfile(
  sheet: Sheet,
  ground: ElasticGround,
  given: GroundProfile,
  toe: number,
  pointer: string,
  notice: (n: Notice) => void,
): ContinuumProfile {
  const lacking = ground.layers.findIndex((s) => s.layer.youngsModulus === undefined && s.top > toe - SAME_DEPTH)
  const used = lacking < 0 ? ground.layers : ground.layers.slice(0, lacking)
  if (lacking >= 0)
    notice({
      code: 'ground-carried-on',
      level: 'caution',
      pointer: `${pointer}/layers/${ground.layers[lacking]!.index}`,
      text: `${ground.layers[lacking]!.layer.name} has no youngsModulus: ${used.at(-1)!.layer.name} was carried on below ${used.at(-1)!.bottom.toFixed(1)} m for the settlement.`,
    })
  const terms: Term[] = []
  const keep = <T extends Term>(term: T): T => {
    if (!terms.some((t) => t.from === term.from && t.symbol === term.symbol && term.from !== '')) terms.push(term)
    return term
  }
  const layers = used.map((stratum, place): ElasticLayer => {
    const last = place === used.length - 1 && !given.rigidBase
    const ends = Number.isFinite(stratum.bottom)
    const here = sheet.within(`${place}`)
    const z_t = keep(ground.top(place))
    const top = ground.at(here.within('top'), stratum, z_t)
    keep(top.E)
    keep(top.nu)
    const E = { top: top.E.value, bottom: top.E.value }
    if (ends && varies(stratum)) {
      const z_b = keep(ground.bottom(stratum.index))
      E.bottom = keep(ground.at(here.within('bottom'), stratum, z_b).E).value
    } else if (ends && given.rigidBase && place === used.length - 1) keep(ground.bottom(stratum.index))
    // A cut profile goes on with its last layer; the modulus at its bottom stays.
    return { top: stratum.top, bottom: last && !ends ? Number.POSITIVE_INFINITY : stratum.bottom, E, nu: top.nu.value }
  })
  const end = layers.at(-1)!
  if (!given.rigidBase && Number.isFinite(end.bottom))
    layers.push({
      ...end,
      top: end.bottom,
      bottom: Number.POSITIVE_INFINITY,
      E: { top: end.E.bottom, bottom: end.E.bottom },
    })
  return { profile: { layers, rigidBase: given.rigidBase ?? false }, terms }
}

const varies = ({ layer }: Stratum): boolean => typeof layer.youngsModulus === 'object'
