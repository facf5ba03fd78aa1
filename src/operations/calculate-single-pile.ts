import { singlePileRequest } from '../contract/requests.ts'
import { calculateSinglePile as compute } from '../engine/index.ts'
import { calculate, type Options } from './calculate.ts'

export const calculateSinglePile = (input: unknown, options: Options) =>
  calculate(singlePileRequest, compute, input, options)
