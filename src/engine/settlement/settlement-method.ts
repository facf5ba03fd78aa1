import type { GroundProfile } from '../ground/profile-types.ts'
import type { Notice } from '../notice.ts'
import type { PileType } from '../piles/pile-type.ts'
import type { SettlementMethod } from '../requests.ts'
import type { Sheet } from '../trace/sheet.ts'
import { elasticContinuum } from './elastic-continuum.ts'
import type { PileResponse, SettlementPlaces } from './pile-response.ts'
import { randolphWroth } from './randolph-wroth-1978.ts'

/** The method where a request names none. */
export const usualSettlementMethod: SettlementMethod = 'elastic-continuum'

const methods: Readonly<Record<SettlementMethod, typeof randolphWroth>> = {
  'elastic-continuum': elasticContinuum,
  'randolph-wroth-1978': randolphWroth,
}

/** One pile by the method asked for; said in a notice where none was. */
export function pileResponse(
  sheet: Sheet,
  method: SettlementMethod | undefined,
  pile: PileType,
  ground: GroundProfile,
  at: SettlementPlaces,
  notice: (n: Notice) => void,
): PileResponse {
  if (method === undefined)
    notice({
      code: 'default-used',
      level: 'info',
      text: `settlement: ${usualSettlementMethod} was used. Default for settlements.`,
    })
  return methods[method ?? usualSettlementMethod](sheet, pile, ground, at, notice)
}
