import { parse } from '../contract/parse.ts'
import { groupRequest, settlementRequest, singlePileRequest } from '../contract/requests.ts'
import { calculationSheet } from '../print/calculation-sheet.ts'
import type { Calculation } from '../print/record.ts'
import type { Options } from './calculate.ts'
import { calculateBlock } from './calculate-block.ts'
import { calculateGroup } from './calculate-group.ts'
import { calculateSettlement } from './calculate-settlement.ts'
import { calculateSinglePile } from './calculate-single-pile.ts'

/** What each calculator's sheet is printed from: the request in the engine's units, and its answer. */
const calculations = {
  'single-pile': (input: unknown, options: Options) => {
    const { meta, ...answer } = calculateSinglePile(input, options)
    return { kind: 'single-pile', request: parse(singlePileRequest, input), answer, meta }
  },
  block: (input: unknown, options: Options) => {
    const { meta, ...answer } = calculateBlock(input, options)
    return { kind: 'block', request: parse(groupRequest, input), answer, meta }
  },
  group: (input: unknown, options: Options) => {
    const { meta, ...answer } = calculateGroup(input, options)
    return { kind: 'group', request: parse(groupRequest, input), answer, meta }
  },
  settlement: (input: unknown, options: Options) => {
    const { meta, ...answer } = calculateSettlement(input, options)
    return { kind: 'settlement', request: parse(settlementRequest, input), answer, meta }
  },
} satisfies Record<Calculation['kind'], (input: unknown, options: Options) => Calculation>

/** The calculation sheet of a calculator's answer; a sheet always shows its lines. */
export const printCalculation = (kind: Calculation['kind'], input: unknown, options: Options): string =>
  calculationSheet(calculations[kind](input, { ...options, trace: true }))
