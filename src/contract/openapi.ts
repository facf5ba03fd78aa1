import { z } from 'zod'
import { engineVersion } from '../engine/index.ts'
import { changesReply } from './changes-reply.ts'
import { header, inPath, json, problem, query, scheduleForm, schemaRef } from './openapi-parts.ts'
import { pagePaths } from './page-paths.ts'
import { designBasis, groundProfile, layout, pileType } from './parts.ts'
import { replayRequest, step } from './replay.ts'
import * as replies from './replies.ts'
import { groupRequest, methodChoices, settlementRequest, singlePileRequest } from './requests.ts'
import { scheduleRequest } from './schedule.ts'
import { storedPaths } from './stored-paths.ts'
import * as stored from './stored-replies.ts'
import { projectRequest, signatureRequest } from './stored-requests.ts'

const requests = {
  GroundProfile: groundProfile,
  PileType: pileType,
  Layout: layout,
  DesignBasis: designBasis,
  MethodChoices: methodChoices,
  SinglePileRequest: singlePileRequest,
  GroupRequest: groupRequest,
  SettlementRequest: settlementRequest,
  Schedule: scheduleRequest,
  ReplayRequest: replayRequest,
  ProjectRequest: projectRequest,
  SignatureRequest: signatureRequest,
}
const answers = {
  Step: step,
  Notice: replies.notice,
  Trace: replies.trace,
  SinglePileResult: replies.singlePileResult,
  BlockResult: replies.blockResult,
  Check: replies.checkResult,
  SinglePileAnswer: replies.singlePileAnswer,
  BlockAnswer: replies.blockAnswer,
  GroupAnswer: replies.groupAnswer,
  SettlementAnswer: replies.settlementAnswer,
  AssessmentAnswer: replies.assessmentAnswer,
  ReplayAnswer: replies.replayAnswer,
  Problem: replies.problemReply,
  MethodList: replies.methodList,
  MethodReply: replies.methodReply,
  SourceList: replies.sourceList,
  LimitList: replies.limitList,
  Project: stored.project,
  ProjectList: stored.projectList,
  Assessment: stored.assessment,
  Job: stored.job,
  AssessmentOrJob: stored.assessmentOrJob,
  JobProgress: stored.jobProgress,
  AssessmentList: stored.assessmentList,
  Content: stored.content,
  CapRow: stored.capRow,
  CapList: stored.capList,
  CapReply: stored.capReply,
  ChangesReply: changesReply,
  Signature: stored.signature,
  SignatureList: stored.signatureList,
  IntegrityReply: stored.integrityReply,
  ReverifyReply: stored.reverifyReply,
}

/** A route of version 1, its example named after the file of `schema/examples/` that is sent in the tests. */
type Calculator = {
  readonly operationId: string
  readonly summary: string
  readonly request: keyof typeof requests
  readonly answer: keyof typeof answers
  readonly example?: string
}
export const calculators: Readonly<Record<string, Calculator>> = {
  '/v1/single-pile': {
    operationId: 'calculateSinglePile',
    summary: 'Resistance of one pile, compression or uplift',
    request: 'SinglePileRequest',
    answer: 'SinglePileAnswer',
    example: 'single-pile',
  },
  '/v1/block': {
    operationId: 'calculateBlock',
    summary: 'Resistance of the block that a layout encloses',
    request: 'GroupRequest',
    answer: 'BlockAnswer',
    example: 'block',
  },
  '/v1/group': {
    operationId: 'calculateGroup',
    summary: 'Sum of single piles against block: what governs',
    request: 'GroupRequest',
    answer: 'GroupAnswer',
    example: 'group',
  },
  '/v1/settlement': {
    operationId: 'calculateSettlement',
    summary: 'Settlement, tilt, pile loads and stiffness',
    request: 'SettlementRequest',
    answer: 'SettlementAnswer',
    example: 'settlement',
  },
  '/v1/assessments': {
    operationId: 'assessSchedule',
    summary: 'Every check of every cap of a schedule; nothing is stored',
    request: 'Schedule',
    answer: 'AssessmentAnswer',
    example: 'assessment',
  },
  '/v1/replay': {
    operationId: 'replayTrace',
    summary: 'Re-evaluate a trace',
    request: 'ReplayRequest',
    answer: 'ReplayAnswer',
  },
}
const lists = {
  '/v1/methods': ['listMethods', 'Every method with source, validity, parameters and formulas', 'MethodList'],
  '/v1/sources': ['listSources', 'The bibliography', 'SourceList'],
  '/v1/limits': ['listLimits', 'What one request may hold', 'LimitList'],
} as const

function components(): Record<string, unknown> {
  const named = (schemas: Readonly<Record<string, z.ZodType>>, io: 'input' | 'output') => {
    const registry = z.registry<{ id: string }>()
    for (const [id, schema] of Object.entries(schemas)) registry.add(schema, { id })
    const made = z.toJSONSchema(registry, {
      io,
      unrepresentable: 'any',
      uri: (id) => `#/components/schemas/${id}`,
    }).schemas
    return Object.entries(made).map(([id, { $schema, $id, ...schema }]) => [id, schema] as const)
  }
  return Object.fromEntries([...named(requests, 'input'), ...named(answers, 'output')])
}

/** A calculator's answer, or the sheet of it to look at and to sign. */
const answerOrPage = (id: string) => ({
  description: 'The answer; with `Accept: text/html` as a page',
  headers: { Vary: header('Accept') },
  content: { 'application/json': { schema: schemaRef(id) }, 'text/html': { schema: { type: 'string' } } },
})
const failures = {
  '400': problem('The body or URL cannot be read'),
  '401': problem('No valid key, where the service asks for one'),
  '403': problem('The key lacks a scope'),
  '406': problem('The route answers in no accepted type'),
  '413': problem('The body is larger than the limit (`bodyBytes` of GET /v1/limits)'),
  '415': problem('The content type is not accepted'),
  '422': problem('The request is invalid or physically impossible; `errors` lists every fault'),
  '503': problem('The service is busy or stopping'),
}
const options = [
  query('trace', '`none` leaves the trace out'),
  query('of', 'JSON Pointer into the result: only the steps behind it'),
]
const oneCap = query('cap', 'Mark of a cap: the trace holds every combination of this cap, and nothing of the others')

/** The OpenAPI 3.1 document. Requests are described by the schemas that parse them, so the two cannot differ. */
export function openapi(examples: Readonly<Record<string, unknown>>) {
  const paths: Record<string, unknown> = {}
  for (const [path, { operationId, summary, request, answer, example }] of Object.entries(calculators)) {
    const body = { schema: schemaRef(request), ...(example && { example: examples[example] }) }
    const content: Record<string, unknown> = { 'application/json': body }
    if (path === '/v1/assessments') content['multipart/form-data'] = scheduleForm
    const slow = path === '/v1/assessments' ? { '504': problem('The work took longer than the service allows') } : {}
    paths[path] = {
      post: {
        operationId,
        summary,
        tags: ['calculators'],
        ...(example && { parameters: path === '/v1/assessments' ? [...options, oneCap] : options }),
        requestBody: { required: true, content },
        responses: {
          '200': example ? answerOrPage(answer) : json(answer, 'The answer'),
          ...failures,
          ...slow,
        },
      },
    }
  }
  for (const [path, [operationId, summary, reply]] of Object.entries(lists))
    paths[path] = { get: { operationId, summary, tags: ['catalogue'], responses: { '200': json(reply, 'The list') } } }
  paths['/v1/methods/{id}'] = {
    get: {
      operationId: 'getMethod',
      tags: ['catalogue'],
      summary: 'The methods of one id',
      parameters: [inPath('id', 'Id of a method')],
      responses: { '200': json('MethodReply', 'The methods'), '404': problem('No method has this id') },
    },
  }
  Object.assign(paths, storedPaths(examples), pagePaths)
  const description =
    'Axial design of pile foundations. Units: m, kN, kPa, kN/m3, degrees; settlement in mm. Every quantity also takes a string with a unit. What one request may hold: GET /v1/limits.'
  return {
    openapi: '3.1.0',
    info: {
      title: 'Kentledge',
      version: engineVersion.split('/')[1],
      description,
      license: { name: 'MIT', identifier: 'MIT' },
    },
    servers: [{ url: '/' }],
    security: [{ key: [] }, {}],
    paths,
    components: { schemas: components(), securitySchemes: { key: { type: 'http', scheme: 'bearer' } } },
  }
}
