import { z } from 'zod'
import { engineVersion } from '../engine/index.ts'
import { replayRequest } from './replay.ts'
import { groupRequest, settlementRequest, singlePileRequest } from './requests.ts'
import { scheduleRequest } from './schedule.ts'

const calculators: Readonly<Record<string, readonly [operationId: string, summary: string, schema: z.ZodType]>> = {
  '/v1/single-pile': ['calculateSinglePile', 'Resistance of one pile, compression or uplift', singlePileRequest],
  '/v1/block': ['calculateBlock', 'Resistance of the block that a layout encloses', groupRequest],
  '/v1/group': ['calculateGroup', 'Sum of single piles against block: what governs', groupRequest],
  '/v1/settlement': ['calculateSettlement', 'Settlement, tilt, pile loads and stiffness', settlementRequest],
  '/v1/assessments': ['assessSchedule', 'Every check of every cap of a schedule; nothing is stored', scheduleRequest],
  '/v1/replay': ['replayTrace', 'Re-evaluate a trace', replayRequest],
}
const lists = {
  '/v1/methods': ['listMethods', 'Every method'],
  '/v1/sources': ['listSources', 'The bibliography'],
  '/v1/limits': ['listLimits', 'What one request may hold'],
} as const

const problem = {
  description: 'A problem document (RFC 9457)',
  content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
}
const answer = {
  description: 'The answer',
  content: { 'application/json': { schema: { $ref: '#/components/schemas/Answer' } } },
}
const listed = { description: 'The list', content: { 'application/json': { schema: { type: 'object' } } } }
const failures = Object.fromEntries(['400', '413', '415', '422', '503'].map((status) => [status, problem]))

const text = { type: 'string' }
const components = {
  schemas: {
    Answer: {
      type: 'object',
      required: ['result', 'notices', 'meta'],
      properties: {
        result: { type: 'object' },
        notices: { type: 'array', items: { type: 'object' } },
        trace: { type: 'object' },
        meta: { type: 'object', properties: { engine: text, requestHash: text } },
      },
    },
    Problem: {
      type: 'object',
      required: ['type', 'title', 'status'],
      properties: {
        type: text,
        title: text,
        status: { type: 'integer' },
        detail: text,
        errors: {
          type: 'array',
          items: {
            type: 'object',
            required: ['pointer', 'code', 'detail'],
            properties: { pointer: text, code: text, detail: text },
          },
        },
      },
    },
  },
}

/** The OpenAPI 3.1 document. Request schemas come from the schemas that parse requests, so the two cannot differ. */
export function openapi() {
  const paths: Record<string, unknown> = {}
  for (const [path, [operationId, summary, schema]] of Object.entries(calculators)) {
    const { $schema, ...body } = z.toJSONSchema(schema, { io: 'input', unrepresentable: 'any' })
    paths[path] = {
      post: {
        operationId,
        summary,
        requestBody: { required: true, content: { 'application/json': { schema: body } } },
        responses: { '200': answer, ...failures },
      },
    }
  }
  for (const [path, [operationId, summary]] of Object.entries(lists))
    paths[path] = { get: { operationId, summary, responses: { '200': listed } } }
  const id = { name: 'id', in: 'path', required: true, schema: text }
  paths['/v1/methods/{id}'] = {
    get: {
      operationId: 'getMethod',
      summary: 'The methods of one id',
      parameters: [id],
      responses: { '200': listed, '404': problem },
    },
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Kentledge',
      version: engineVersion.split('/')[1],
      description: 'Axial design of pile foundations. Units: m, kN, kPa, degrees; settlement in mm.',
    },
    paths,
    components,
  }
}
