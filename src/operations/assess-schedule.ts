import { scheduleRequest } from '../contract/schedule.ts'
import { assess as compute } from '../engine/index.ts'
import { calculate, type Options } from './calculate.ts'

export const assessSchedule = (input: unknown, options: Options) => calculate(scheduleRequest, compute, input, options)
