import { z } from 'zod'
import type { Schedule } from '../engine/assessment/schedule.ts'
import { limits } from './limits.ts'
import { designBasis, groundProfile, layout, pileType } from './parts.ts'
import { quantity } from './quantity.ts'
import { methodChoices, settlementMethod } from './requests.ts'

const name = z.string().min(1).max(200)
const place = (axis: string) => quantity('m', `position along ${axis}`, { min: -1e6, max: 1e6 })
const force = (description: string) => quantity('kN', description, { min: -1e8, max: 1e8 })
const moment = (description: string) => quantity('kN.m', description, { min: -1e9, max: 1e9 })

const cap = z.strictObject({
  mark: name,
  x: place('x'),
  y: place('y'),
  ground: name,
  pileType: name,
  layout,
  capWeight: quantity('kN', 'weight of the cap, added to V', { min: 0, max: 1e7 }).optional(),
})
const where = { cap: name, combination: name }
const modelRow = z.strictObject({
  ...where,
  Fx: force('Fx'),
  Fy: force('Fy'),
  Fz: force('Fz'),
  Mx: moment('Mx'),
  My: moment('My'),
  Mz: moment('Mz'),
})
const pressingRow = z.strictObject({ ...where, V: force('V'), Mx: moment('Mx'), My: moment('My') })
/** A record by names. A record drops the name `__proto__` in silence, so it is refused before. */
const named = <V extends z.ZodType>(value: V) =>
  z.preprocess(
    (input, context) => {
      if (typeof input === 'object' && input !== null && Object.hasOwn(input, '__proto__')) {
        const params = { code: 'unknown-field', field: '__proto__' }
        context.addIssue({ code: 'custom', path: ['__proto__'], params })
      }
      return input
    },
    z.record(name, value),
  )
const combinations = named(z.strictObject({ limitState: z.enum(['ultimate', 'working', 'serviceability']) }))
const signed = <S extends string, R extends z.ZodType>(signs: S, row: R) =>
  z.strictObject({
    signs: z.literal(signs),
    loadsAre: z.enum(['actions', 'reactions']),
    combinations,
    rows: z.array(row).min(1).max(limits.rows),
  })

/** The input of the main job. */
export const scheduleRequest = z.strictObject({
  title: z.string().min(1).max(500),
  designBasis,
  methods: methodChoices.optional(),
  settlementMethod: settlementMethod.optional(),
  capInteraction: z
    .boolean()
    .optional()
    .meta({ description: 'true: each cap also settles in the field of all others; left out: caps settle alone' }),
  ground: named(groundProfile),
  pileTypes: named(pileType),
  caps: z.array(cap).min(1).max(limits.caps),
  loads: z.discriminatedUnion('signs', [
    signed('pressing', pressingRow),
    signed('right-handed-z-up', modelRow),
    signed('right-handed-z-down', modelRow),
  ]),
  limits: z
    .strictObject({
      settlement: quantity('mm', 'largest settlement', { above: 0, max: 10_000 }).optional(),
      tilt: quantity('1', 'largest tilt', { above: 0, max: 1 }).optional(),
      angularDistortion: quantity('1', 'largest angular distortion', { above: 0, max: 1 }).optional(),
    })
    .optional(),
}) satisfies z.ZodType<Schedule>
