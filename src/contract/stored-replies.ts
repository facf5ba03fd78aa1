import { z } from 'zod'
import { assessmentResult, checkKinds, notice, problemReply, trace } from './replies.ts'

const text = z.string()
const time = z.string().meta({ description: 'ISO 8601, UTC' })
const hash = (of: string) =>
  z
    .string()
    .regex(/^sha256:[0-9a-f]{64}$/)
    .meta({ description: `SHA-256 of ${of}` })
const out = (unit: string, description: string) => z.number().meta({ description, 'x-unit': unit })
const maybe = (unit: string, description: string) => z.number().nullable().meta({ description, 'x-unit': unit })
const listOf = <Item extends z.ZodType>(item: Item) =>
  z.strictObject({ items: z.array(item), next: text.optional().meta({ description: 'cursor of the next page' }) })

export const project = z.strictObject({
  slug: text,
  title: text,
  createdAt: time,
  updatedAt: time,
  revision: z.int().meta({ description: 'number of its newest assessment, 0 before the first' }),
})

export const assessment = z.strictObject({
  id: text,
  project: text,
  revision: z.int(),
  title: text,
  state: z.enum(['completed']),
  createdAt: time,
  actor: text.meta({ description: 'the person or pipeline that the key belongs to' }),
  actorKey: text.nullable().meta({ description: 'id of the key; null where the service runs without keys' }),
  engine: text,
  requestHash: hash('the canonical request'),
  contentHash: hash('the content, as /content gives it'),
  traceHash: hash('the traces'),
  previousHash: hash('the record before it in its project; zeros for the first'),
  recordHash: hash('the canonical JSON of this object without recordHash, state and summary'),
  summary: assessmentResult.shape.summary,
})

const jobState = z.enum(['queued', 'running', 'failed', 'cancelled'])
const capsDone = {
  done: z.int().meta({ description: 'caps whose piles are computed' }),
  caps: z.int().nullable().meta({ description: 'of so many; null until the schedule has been read' }),
}

export const job = z
  .strictObject({
    id: text.meta({ description: 'of the record to come' }),
    project: text,
    state: jobState,
    createdAt: time,
    startedAt: time.nullable().meta({ description: 'when it was begun last' }),
    finishedAt: time.nullable(),
    actor: text,
    actorKey: text.nullable(),
    attempts: z.int().meta({ description: 'how often it was begun' }),
    progress: z.strictObject(capsDone),
    problem: problemReply.optional().meta({ description: 'why there is no record: of failed and cancelled ones' }),
  })
  .meta({ description: 'An assessment that is no record yet, or never will be; this is kept for 30 days' })

export const assessmentOrJob = z.union([assessment, job])

export const jobProgress = z
  .strictObject({ id: text, state: z.enum([...jobState.options, 'completed']), ...capsDone })
  .meta({ description: 'The data of an event' })

const request = z.looseObject({}).meta({ description: 'the schedule, every quantity in its unit' })
export const content = z.strictObject({ notices: z.array(notice), request, result: assessmentResult })

export const capRow = z.strictObject({
  mark: text,
  ground: text,
  pileType: text,
  pileCount: z.int(),
  x: out('m', 'position in plan'),
  y: out('m', 'position in plan'),
  governingCheck: z.enum(checkKinds).nullable(),
  governingCombination: text.nullable(),
  utilisation: maybe('1', 'largest of its checks'),
  exceeded: z.boolean(),
  settlement: maybe('mm', 'largest over the combinations'),
  tilt: maybe('1', 'largest over the combinations'),
  verticalStiffness: out('kN/m', 'of the cap'),
  rockingStiffnessAlongX: out('kN.m/rad', 'of the cap'),
  rockingStiffnessAlongY: out('kN.m/rad', 'of the cap'),
})

export const capReply = z.strictObject({
  result: assessmentResult.shape.caps.element,
  trace: trace.optional().meta({ description: 'pointers lead into `result` of the content' }),
})

export const signature = z.strictObject({
  id: text,
  assessment: text,
  ordinal: z.int(),
  role: z.enum(['originator', 'checker', 'approver']),
  meaning: text,
  actor: text,
  actorKey: text.nullable(),
  signedAt: time,
  signedHash: hash('the record that is signed'),
  previousHash: hash('the signature before it; zeros for the first'),
  signatureHash: hash('the canonical JSON of this signature, `assessment` named `record`, without signatureHash'),
})

export const integrityReply = z.strictObject({
  project: text,
  holds: z.boolean(),
  records: z.int(),
  checkpoint: z
    .strictObject({ revision: z.int(), hash: hash('the newest record') })
    .meta({ description: 'to be kept elsewhere: given back later, it shows rows that were cut off' }),
  flaws: z.array(
    z.strictObject({
      revision: z.int(),
      id: text.optional(),
      table: z.enum(['records', 'caps', 'checks', 'neighbours', 'traces', 'signatures', 'projects']),
      at: text.optional(),
      what: text,
    }),
  ),
})

const run = z.strictObject({ engine: text, contentHash: hash('the content') })
export const reverifyReply = z.strictObject({
  id: text,
  identical: z.boolean(),
  stored: run,
  computed: run,
  count: z.int().meta({ description: 'of all changes' }),
  changes: z
    .array(z.strictObject({ pointer: text, before: z.unknown().optional(), after: z.unknown().optional() }))
    .meta({ description: 'at most 1000; pointers lead into the content' }),
})

export const projectList = listOf(project)
export const assessmentList = listOf(assessment)
export const capList = listOf(capRow)
export const signatureList = z.strictObject({ items: z.array(signature) })
