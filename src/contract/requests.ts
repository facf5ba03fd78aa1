import { z } from 'zod'
import { baseMethods, shaftMethods } from '../engine/index.ts'
import type { MethodChoices } from '../engine/methods/method-choice.ts'
import type { GroupRequest, SettlementRequest, SinglePileRequest } from '../engine/requests.ts'
import { designBasis, groundProfile, layout, pileType } from './parts.ts'
import { quantity } from './quantity.ts'

type Card = (typeof shaftMethods)['cohesiveShaft']['rp2geo-2011']

/** A method by id, or by id with its own parameters, each checked. */
function choice<Id extends string>(table: Readonly<Record<Id, Pick<Card, 'parameters'>>>) {
  const ids = Object.keys(table) as [Id, ...Id[]]
  const settings = ids.map((id) => {
    const fields = Object.entries(table[id].parameters).map(([name, p]) => {
      const field = quantity(p.unit, p.name, { min: p.min, max: p.max })
      return [name, p.required ? field : field.optional()] as const
    })
    return z.strictObject({ method: z.literal(id), ...Object.fromEntries(fields) })
  })
  return z.union([z.enum(ids), z.discriminatedUnion('method', settings as [(typeof settings)[0], ...typeof settings])])
}

const ratio = quantity('1', 'share of the shaft resistance in uplift', { min: 0, max: 1 }).optional()
export const methodChoices = z.strictObject({
  cohesiveShaft: choice(shaftMethods.cohesiveShaft).optional(),
  cohesiveBase: choice(baseMethods.cohesiveBase).optional(),
  granularShaft: choice(shaftMethods.granularShaft).optional(),
  granularBase: choice(baseMethods.granularBase).optional(),
  upliftRatio: z.strictObject({ cohesive: ratio, granular: ratio }).optional(),
  sublayer: quantity('m', 'longest sublayer of the shaft sum', { min: 0.05, max: 100 }).optional(),
}) as unknown as z.ZodType<MethodChoices>

const single = {
  pile: pileType,
  ground: groundProfile,
  direction: z.enum(['compression', 'uplift']).optional(),
  methods: methodChoices.optional(),
  designBasis: designBasis.optional(),
}
export const singlePileRequest = z.strictObject(single) satisfies z.ZodType<SinglePileRequest>
export const groupRequest = z.strictObject({ ...single, layout }) satisfies z.ZodType<GroupRequest>

const force = (description: string) => quantity('kN', description, { min: -1e8, max: 1e8 })
const moment = (description: string) => quantity('kN.m', description, { min: -1e9, max: 1e9 }).optional()
export const settlementMethod = z
  .enum(['elastic-continuum', 'randolph-wroth-1978'])
  .meta({ description: 'left out: elastic-continuum' })
export const settlementRequest = z.strictObject({
  pile: pileType,
  ground: groundProfile,
  layout: layout.optional(),
  load: z.strictObject({
    V: force('vertical load, positive downward'),
    Mx: moment('moment that presses piles at +y'),
    My: moment('moment that presses piles at +x'),
  }),
  cap: z.enum(['rigid', 'flexible']).optional(),
  method: settlementMethod.optional(),
  nonlinearity: z.enum(['hyperbolic']).optional().meta({
    description:
      "hyperbolic: the pile's own springs soften towards its resistance by `methods`; gives load-settlement curves (elastic-continuum)",
  }),
  failureRatio: z
    .strictObject({
      shaft: quantity('1', 'R_f of the shaft; left out 0.5', { min: 0, max: 0.99 }).optional(),
      base: quantity('1', 'R_f of the base; left out 0.9', { min: 0, max: 0.99 }).optional(),
    })
    .optional(),
  methods: methodChoices.optional(),
  coupling: z.enum(['full']).optional().meta({
    description:
      'full: every element of every pile acts on every other (elastic-continuum, up to 64 piles); left out: superposed interaction factors',
  }),
}) satisfies z.ZodType<SettlementRequest>
