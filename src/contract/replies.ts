import { z } from 'zod'
import type { UnitCode } from '../engine/quantities/units.ts'
import { step } from './replay.ts'

/** A number of an answer, in its unit. */
const out = (unit: UnitCode, description: string) => z.number().meta({ description, 'x-unit': unit })
const safe = {
  designResistance: out('kN', 'after partial or resistance factors').optional(),
  allowableLoad: out('kN', 'under an overall factor').optional(),
}
const text = z.string()

export const notice = z.strictObject({
  code: text,
  level: z.enum(['caution', 'warning', 'info']),
  text,
  pointer: text.optional(),
})
const source = z.strictObject({
  key: text,
  title: text,
  author: text,
  year: z.int().nullable(),
  basis: z.enum(['published', 'common practice', 'memory']),
})
export const trace = z.strictObject({ steps: z.array(step), results: z.record(text, text), sources: z.array(source) })
const meta = z.strictObject({ engine: text, requestHash: text })
const answerOf = <R extends z.ZodType>(result: R) =>
  z.strictObject({ result, notices: z.array(notice), trace: trace.optional(), meta })

export const singlePileResult = z.strictObject({
  shaftResistance: out('kN', 'resistance of the shaft'),
  baseResistance: out('kN', 'resistance of the base'),
  ultimateResistance: out('kN', 'unfactored resistance'),
  ...safe,
  weight: out('kN', 'effective weight, counted in uplift').optional(),
  layers: z.array(
    z.strictObject({
      name: text,
      top: out('m', 'depth'),
      bottom: out('m', 'depth'),
      unitShaftResistance: out('kPa', 'mean over the layer'),
      shaftResistance: out('kN', 'in this layer'),
    }),
  ),
  unitBaseResistance: out('kPa', 'at the toe'),
  toeDepth: out('m', 'depth of the toe'),
})
export const blockResult = z.strictObject({
  breadth: out('m', 'smaller side'),
  length: out('m', 'larger side'),
  depth: out('m', 'depth of the toe'),
  perimeter: out('m', 'of the block'),
  baseArea: out('m2', 'of the block'),
  sideResistance: out('kN', 'soil on soil'),
  baseResistance: out('kN', 'of the block'),
  ultimateResistance: out('kN', 'unfactored resistance'),
  weight: out('kN', 'effective weight, counted in uplift').optional(),
  ...safe,
})
export const groupResult = z.strictObject({
  pileCount: z.int(),
  single: singlePileResult,
  sumOfPiles: out('kN', 'single pile times number'),
  efficiency: out('1', 'smaller of sum and block over the sum'),
  block: blockResult,
  governing: z.enum(['piles', 'block']),
  ultimateResistance: out('kN', 'the smaller'),
  ...safe,
})
const tilt = z.strictObject({
  alongX: out('1', 'slope of settlement along x'),
  alongY: out('1', 'slope of settlement along y'),
})
const matrix = (description: string) => z.array(z.array(z.number()).length(3)).length(3).meta({ description })
const atOrigin = z
  .strictObject({
    flexibility: matrix(
      'rows: settlement (m), slope along x, slope along y (rad); columns: V (kN), My, Mx (kN.m). Units m/kN, 1/kN, rad/(kN.m). Symmetric',
    ),
    stiffness: matrix(
      'its inverse: rows V, My, Mx; columns settlement, slope along x, slope along y. Units kN/m, kN/rad, kN.m/rad. Symmetric; 0 where the piles cannot take it',
    ),
  })
  .meta({ description: "rigid cap at the cap's origin, pressing signs: ready for a structural model" })
const curve = z
  .array(z.strictObject({ load: out('kN', 'load'), settlement: out('mm', 'settlement') }))
  .optional()
  .meta({ description: 'load-settlement curve, with nonlinearity hyperbolic' })
const stiffness = z.strictObject({
  vertical: out('kN/m', 'vertical'),
  rockingAlongX: out('kN.m/rad', 'rocking along x; 0 where the piles cannot take it'),
  rockingAlongY: out('kN.m/rad', 'rocking along y; 0 where the piles cannot take it'),
  atOrigin,
})
export const settlementResult = z.strictObject({
  single: z.strictObject({
    load: out('kN', 'V over the number of piles'),
    settlement: out('mm', 'of the pile head'),
    stiffness: out('kN/m', 'of the pile head'),
    influenceFactor: out('1', 'I of s = P I / (E_s d)'),
    baseLoadShare: out('1', 'share of the load at the base'),
    axial: z
      .array(
        z.strictObject({
          depth: out('m', 'bottom of an element'),
          axialLoad: out('kN', 'in the pile at this depth'),
          shaftStress: out('kPa', 'mean on the element above this depth'),
        }),
      )
      .optional()
      .meta({ description: 'along the pile from the head down (elastic-continuum)' }),
    curve,
  }),
  group: z
    .strictObject({
      settlement: out('mm', 'at the centroid of the piles'),
      settlementRatio: out('1', 'over the single pile').optional(),
      tilt,
      largest: out('mm', 'flexible cap').optional(),
      differential: out('mm', 'flexible cap').optional(),
      curve,
      piles: z.array(
        z.strictObject({
          x: out('m', 'position'),
          y: out('m', 'position'),
          load: out('kN', 'of the pile'),
          settlement: out('mm', 'of the pile'),
        }),
      ),
      stiffness,
    })
    .optional(),
})
export const checkKinds = [
  'pile-compression',
  'pile-uplift',
  'group-compression',
  'block-compression',
  'group-uplift',
  'block-uplift',
  'pile-section',
  'settlement',
  'tilt',
] as const
export const checkResult = z.strictObject({
  check: z.enum(checkKinds),
  combination: text,
  demand: z.number().meta({ description: 'kN, mm or ratio, by check' }),
  resistance: z.number().meta({ description: 'in the unit of the demand' }),
  utilisation: out('1', 'demand over resistance'),
  satisfied: z.boolean(),
  pile: z.int().optional(),
})
const worstCheck = z.strictObject({
  cap: text,
  neighbour: text.meta({ description: 'the other cap of an angular distortion' }).optional(),
  check: z.enum([...checkKinds, 'angular-distortion']),
  combination: text,
  utilisation: out('1', 'largest'),
})
export const assessmentResult = z.strictObject({
  summary: z.strictObject({
    caps: z.int(),
    satisfied: z.int().meta({ description: 'caps with every check satisfied' }),
    exceeded: z.int().meta({ description: 'caps with a check exceeded; neighbours are counted in `checks` alone' }),
    worst: worstCheck.optional().meta({ description: 'of all caps and neighbours' }),
    checks: z
      .array(z.strictObject({ ...worstCheck.shape, count: z.int(), exceeded: z.int() }))
      .meta({ description: 'the worst of each kind of check, how many were made and how many exceed' }),
  }),
  caps: z.array(
    z.strictObject({
      mark: text,
      pileCount: z.int(),
      single: singlePileResult,
      block: blockResult,
      checks: z.array(checkResult),
      settlement: z.array(
        z.strictObject({
          combination: text,
          settlement: out('mm', 'at the centroid of the piles'),
          tilt: out('1', 'slope of the cap'),
        }),
      ),
      stiffness,
      notices: z.array(notice),
    }),
  ),
  neighbours: z.array(
    z.strictObject({
      a: text,
      b: text,
      distance: out('m', 'in plan'),
      combination: text,
      differentialSettlement: out('mm', 'between the two'),
      angularDistortion: out('1', 'differential settlement over distance'),
      utilisation: out('1', 'of the limit').optional(),
      satisfied: z.boolean().optional(),
    }),
  ),
})
export const replayResult = z.strictObject({
  holds: z.boolean(),
  count: z.int(),
  steps: z.array(
    z.strictObject({
      id: text,
      holds: z.boolean(),
      why: text.optional(),
      printed: z.number().optional(),
      found: z.number().optional(),
    }),
  ),
})

export const singlePileAnswer = answerOf(singlePileResult)
export const blockAnswer = answerOf(blockResult)
export const groupAnswer = answerOf(groupResult)
export const settlementAnswer = answerOf(settlementResult)
export const assessmentAnswer = answerOf(assessmentResult)
export const replayAnswer = z.strictObject({ result: replayResult, notices: z.array(notice), meta })
export const problemReply = z.strictObject({
  type: text,
  title: text,
  status: z.int(),
  detail: text,
  traceId: text.optional(),
  errors: z.array(z.looseObject({ pointer: text, code: text, detail: text })).optional(),
})
const card = z.looseObject({
  id: text,
  kind: text,
  title: text,
  validity: text,
  theory: text.optional(),
  errorBounds: text.optional(),
  needs: z.array(text),
  source,
})
export const methodList = z.strictObject({ methods: z.array(card) })
export const methodReply = z.strictObject({ id: text, methods: z.array(card) })
export const sourceList = z.strictObject({ sources: z.array(source) })
const most = (description: string) => z.int().meta({ description })
export const limitList = z.strictObject({
  layers: most('layers of a ground profile'),
  pilesPerCap: most('piles under one cap'),
  caps: most('caps of a schedule'),
  rows: most('rows of loads in a schedule'),
  bodyBytes: most('bytes of a request; a larger one is a 413'),
  headerBytes: most('bytes of all header fields; more are a 431'),
  requestSeconds: most('seconds until a request must have arrived whole; then 408'),
  assessmentSeconds: most('seconds of an assessment, waiting included; then 504'),
  assessmentsWaiting: most('assessments that wait for a thread; beyond that 503 with Retry-After'),
  jobs: most('assessments by `Prefer: respond-async` that wait or run; beyond that 503 with Retry-After'),
  waitSeconds: most('seconds that `Prefer: wait` is heeded'),
  graphql: z.strictObject({
    depth: most('fields above one another in a document'),
    aliases: most('aliases in a document'),
    tokens: most('tokens of a document'),
    cost: most(
      'objects of an answer, as many as its lists may hold; hundreds for a calculator, a trace and a comparison of revisions',
    ),
    characters: most('characters of a document'),
    subscriptions: most('subscriptions that are open in one socket'),
  }),
})
