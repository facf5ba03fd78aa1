import { calculateBlock } from '../operations/calculate-block.ts'
import { calculateGroup } from '../operations/calculate-group.ts'
import { calculateSettlement } from '../operations/calculate-settlement.ts'
import { calculateSinglePile } from '../operations/calculate-single-pile.ts'

type Calculate = (request: unknown, options: { readonly trace: boolean }) => unknown

/** The operations behind the fields of Query; each throws the problems of its REST route. */
export const calculators = {
  singlePile: calculateSinglePile,
  block: calculateBlock,
  group: calculateGroup,
  settlement: calculateSettlement,
} as const satisfies Readonly<Record<string, Calculate>>

/** Which operation judges a variable of an input type. */
export const judges: Readonly<Record<string, Calculate>> = {
  SinglePileRequestInput: calculateSinglePile,
  GroupRequestInput: calculateGroup,
  SettlementRequestInput: calculateSettlement,
}
