import type { MethodCard } from './methods/method.ts'
import { baseMethods, shaftMethods } from './methods/registry.ts'
import { settlementCards } from './settlement/method-cards.ts'

/** Every method of resistance and settlement, as it is listed to users. */
export const methodCards = (): readonly MethodCard[] => [
  ...[
    shaftMethods.cohesiveShaft,
    baseMethods.cohesiveBase,
    shaftMethods.granularShaft,
    baseMethods.granularBase,
  ].flatMap((table) => Object.values<MethodCard>(table)),
  ...settlementCards,
]
