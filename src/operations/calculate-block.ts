import { groupRequest } from '../contract/requests.ts'
import { calculateBlock as compute } from '../engine/index.ts'
import { calculate, type Options } from './calculate.ts'

export const calculateBlock = (input: unknown, options: Options) => calculate(groupRequest, compute, input, options)
