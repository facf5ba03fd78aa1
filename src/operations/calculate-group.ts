import { groupRequest } from '../contract/requests.ts'
import { calculateGroup as compute } from '../engine/index.ts'
import { calculate, type Options } from './calculate.ts'

export const calculateGroup = (input: unknown, options: Options) => calculate(groupRequest, compute, input, options)
