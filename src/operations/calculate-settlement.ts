import { settlementRequest } from '../contract/requests.ts'
import { calculateSettlement as compute } from '../engine/index.ts'
import { calculate, type Options } from './calculate.ts'

export const calculateSettlement = (input: unknown, options: Options) =>
  calculate(settlementRequest, compute, input, options)
