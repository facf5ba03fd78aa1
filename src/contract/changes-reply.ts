import { z } from 'zod'
import { changedParts } from '../engine/index.ts'
import { checkKinds } from './replies.ts'
import { assessment } from './stored-replies.ts'

const text = z.string()
const count = z.int()
const out = (unit: string, description: string) => z.number().meta({ description, 'x-unit': unit })
const sides = <T extends z.ZodType>(value: T) => ({ before: value.optional(), after: value.optional() })
const figure = (unit: string, description: string) =>
  z.strictObject({ ...sides(out(unit, description)), by: out(unit, 'after less before').optional() })

const check = z.enum([...checkKinds, 'angular-distortion'])
const verdict = { combination: text, utilisation: out('1', 'demand over resistance'), satisfied: z.boolean() }
const governing = z.strictObject({ check, ...verdict })
const by = out('1', 'utilisation after less before').optional()
const change = { check, ...sides(z.strictObject(verdict)), by }
const turned = z.enum(['exceeded', 'satisfied'])
const pair = { a: text, b: text }
const loneCap = z.strictObject({
  mark: text,
  pointer: text.meta({ description: 'into the schedule that has it' }),
  exceeded: z.boolean(),
  governing: governing.optional(),
})

/** What differs between two revisions. Everything that is the same on both sides is left out. */
export const changesReply = z.strictObject({
  before: assessment,
  after: assessment,
  counts: z
    .strictObject({
      turnedExceeded: count,
      turnedSatisfied: count,
      caps: count,
      added: count,
      gone: count,
      neighbours: count,
      inputs: z.partialRecord(z.enum(changedParts), count),
    })
    .meta({ description: 'of all changes, also where a list is cut' }),
  verdicts: z
    .array(z.strictObject({ cap: text.optional(), a: text.optional(), b: text.optional(), ...change, turned }))
    .meta({
      description: 'checks whose verdict turned, of a cap or of a pair of neighbours; those now exceeded first',
    }),
  caps: z.array(
    z.strictObject({
      mark: text,
      pointer: z.strictObject({ before: text, after: text }).meta({ description: 'into schedule and result' }),
      turned: turned.optional().meta({ description: 'where the verdict of the whole cap turned' }),
      governing: z.strictObject(sides(governing)),
      governingChanged: z.boolean(),
      by,
      checks: z.array(z.strictObject(change)).meta({ description: 'those that changed' }),
      settlement: figure('mm', 'largest over the combinations').optional(),
      verticalStiffness: figure('kN/m', 'of the cap').optional(),
    }),
  ),
  added: z.array(loneCap),
  gone: z.array(loneCap),
  neighbours: z.array(z.strictObject({ ...pair, ...change, angularDistortion: figure('1', 'of the pair') })),
  inputs: z.array(
    z.strictObject({
      part: z.enum(changedParts),
      name: text.meta({ description: 'mark, ground profile, pile type or combination; empty: of the whole schedule' }),
      combination: text.optional(),
      layer: text.optional(),
      pointer: z.strictObject(sides(text)).meta({ description: 'into the schedule of each side' }),
      field: text,
      ...sides(z.unknown()),
      by: z.number().optional().meta({ description: 'after less before' }),
      unit: text.optional(),
    }),
  ),
})
