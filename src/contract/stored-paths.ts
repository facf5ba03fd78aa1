import { header, inPath, json, problem, query, scheduleForm, schemaRef } from './openapi-parts.ts'

const slug = inPath('slug', 'The project')
const id = inPath('id', 'The assessment')
const paging = [query('limit', 'Rows of a page, 1 to 1000; 100 without'), query('cursor', '`next` of the page before')]
const inHeader = (name: string, description: string) => ({
  name,
  in: 'header',
  description,
  schema: { type: 'string' },
})
const ifNoneMatch = inHeader('If-None-Match', 'ETag of what the client holds: 304 where nothing changed')
const tag = { ETag: header('Strong: the same bytes have the same tag') }
const page = { Link: header('rel="next" where there are more rows') }
const notModified = { '304': { description: 'The client holds it already' } }

const refusals = {
  '401': problem('No valid key'),
  '403': problem('The key lacks a scope'),
  '406': problem('The route answers in no accepted type'),
  '422': problem('A parameter or the request is invalid'),
  '503': problem('The service or its store is busy or stopping; try again'),
}
const noProject = { '404': problem('No such project, or none that the key has a right to') }
const noAssessment = { '404': problem('No such assessment, or none that the key has a right to') }
const noRecord = { ...noAssessment, '409': problem('The assessment is not completed') }
const body = (schema: string, example: unknown) => ({
  required: true,
  content: { 'application/json': { schema: schemaRef(schema), example } },
})
const late = { '504': problem('The work took longer than the service allows') }

/** Paths of projects and records. */
export const storedPaths = (examples: Readonly<Record<string, unknown>>) => ({
  '/v1/projects': {
    get: {
      operationId: 'listProjects',
      summary: 'Projects that the key has a right to, by slug',
      tags: ['projects'],
      parameters: paging,
      responses: { '200': json('ProjectList', 'A page', page), ...refusals },
    },
  },
  '/v1/projects/{slug}': {
    get: {
      operationId: 'getProject',
      summary: 'One project',
      tags: ['projects'],
      parameters: [slug, ifNoneMatch],
      responses: { '200': json('Project', 'The project', tag), ...notModified, ...noProject, ...refusals },
    },
    put: {
      operationId: 'putProject',
      summary: 'Make a project, or change its title',
      tags: ['projects'],
      parameters: [
        slug,
        inHeader('If-Match', 'ETag that was read: needed to change a title'),
        inHeader('If-None-Match', '`*`: make it, change nothing'),
      ],
      requestBody: body('ProjectRequest', { title: 'Quay warehouse' }),
      responses: {
        '200': json('Project', 'The project, changed or as it was', tag),
        '201': json('Project', 'The project, made', tag),
        ...noProject,
        '400': problem('The body cannot be read'),
        '412': problem('The project is not as the request expects'),
        '415': problem('The content type is not accepted'),
        '428': problem('A change needs If-Match'),
        ...refusals,
      },
    },
  },
  '/v1/projects/{slug}/assessments': {
    get: {
      operationId: 'listAssessments',
      summary: 'Assessments of a project, oldest first',
      tags: ['projects'],
      parameters: [slug, ...paging],
      responses: { '200': json('AssessmentList', 'A page', page), ...noProject, ...refusals },
    },
    post: {
      operationId: 'recordAssessment',
      summary: 'Assess a schedule and keep it as the next revision of the project',
      tags: ['projects'],
      parameters: [
        slug,
        inHeader('Idempotency-Key', '1 to 255 printable characters: a retry within 24 hours gets the same answer'),
        inHeader(
          'Prefer',
          '`respond-async`: answer as soon as the schedule stands in line; `respond-async, wait=10`: or with the record, where it comes within so many seconds, at most 60 (RFC 7240)',
        ),
      ],
      requestBody: {
        required: true,
        content: {
          'application/json': { schema: schemaRef('Schedule'), example: examples.assessment },
          'multipart/form-data': scheduleForm,
        },
      },
      responses: {
        '201': json('Assessment', 'The record; it is on the disk', {
          ...tag,
          Location: header('The record'),
          'Idempotency-Replayed': header('true where this is the answer of an earlier request'),
        }),
        '202': json('Job', 'With `respond-async`: the schedule stands in line, on the disk', {
          Location: header('Where the record will be; till then its state'),
          Link: header('rel="monitor": its progress as server-sent events'),
          'Retry-After': header('Seconds to the next look'),
          'Preference-Applied': header('What of Prefer was heeded'),
          'Idempotency-Replayed': header('true where this is the answer of an earlier request'),
        }),
        '400': problem('The body cannot be read'),
        ...noProject,
        '409': problem('The first request with this Idempotency-Key is still running'),
        '413': problem('The body is larger than the limit'),
        '415': problem('The content type is not accepted'),
        ...refusals,
        ...late,
      },
    },
  },
  '/v1/projects/{slug}/integrity': {
    get: {
      operationId: 'verifyProject',
      summary: 'Recompute every hash, link and row of the records of a project',
      tags: ['projects'],
      parameters: [
        slug,
        query('revision', 'With `hash`: a checkpoint that an earlier answer gave'),
        query('hash', 'Record hash of that revision'),
      ],
      responses: { '200': json('IntegrityReply', 'What was found'), ...noProject, ...refusals, ...late },
    },
  },
  '/v1/assessments/{id}': {
    get: {
      operationId: 'getAssessment',
      summary: 'One record: state, summary, hashes; how far it is, as long as it is none',
      tags: ['records'],
      parameters: [id, ifNoneMatch],
      responses: {
        '200': json('AssessmentOrJob', 'The record, or the job that is to become one', {
          ...tag,
          Link: header('rel="predecessor-version" and rel="successor-version" (RFC 5829), rel="collection"'),
          'Retry-After': header('Seconds to the next look, while it waits or runs'),
        }),
        ...notModified,
        ...noAssessment,
        ...refusals,
      },
    },
    delete: {
      operationId: 'cancelAssessment',
      summary: 'Cancel an assessment that waits or runs; a record is never deleted',
      tags: ['records'],
      parameters: [id],
      responses: {
        '200': json('Job', 'It is cancelled, now or before'),
        ...noAssessment,
        '409': problem('It is completed, or has failed'),
        ...refusals,
      },
    },
  },
  '/v1/assessments/{id}/events': {
    get: {
      operationId: 'watchAssessment',
      summary: 'Progress as server-sent events, until the assessment ends',
      tags: ['records'],
      parameters: [id],
      responses: {
        '200': {
          description:
            'Events `progress`, then one named for the state at the end: `completed`, `failed` or `cancelled`. The data of each is a JobProgress',
          content: {
            'text/event-stream': {
              schema: { type: 'string' },
              example:
                'event: progress\ndata: {"id":"0199…","state":"running","done":12,"caps":50}\n\nevent: completed\ndata: {"id":"0199…","state":"completed","done":50,"caps":50}\n\n',
            },
          },
        },
        ...noAssessment,
        ...refusals,
      },
    },
  },
  '/v1/assessments/{id}/content': {
    get: {
      operationId: 'getContent',
      summary: 'Request, result and notices as the canonical JSON (RFC 8785) whose SHA-256 is the content hash',
      tags: ['records'],
      parameters: [id, ifNoneMatch],
      responses: { '200': json('Content', 'The content', tag), ...notModified, ...noRecord, ...refusals },
    },
  },
  '/v1/assessments/{id}/caps': {
    get: {
      operationId: 'listCaps',
      summary: 'Caps of a record as flat rows',
      tags: ['records'],
      parameters: [
        id,
        ...paging,
        query('check', 'Only caps with this kind of check, to which the other filters then refer'),
        query('utilisationAtLeast', 'Only caps whose utilisation is at least this'),
        query('exceeded', '`true` or `false`'),
        query('ground', 'Only caps on this ground profile'),
        query('pileType', 'Only caps on piles of this type'),
        query('mark', 'Only caps whose mark contains this'),
        query('order', '`schedule` (as without), `mark`, or largest first by `utilisation` or `settlement`'),
        ifNoneMatch,
      ],
      responses: {
        '200': {
          description: 'A page of rows; as CSV all of them, unless a limit is given',
          headers: { ...tag, ...page },
          content: {
            'application/json': { schema: schemaRef('CapList') },
            'text/csv': { schema: { type: 'string' } },
          },
        },
        ...notModified,
        ...noRecord,
        ...refusals,
      },
    },
  },
  '/v1/assessments/{id}/caps/{mark}': {
    get: {
      operationId: 'getCap',
      summary: 'One cap of a record: checks, settlement, stiffness, and the trace behind them',
      tags: ['records'],
      parameters: [id, inPath('mark', 'Mark of the cap'), query('trace', '`none` leaves the trace out'), ifNoneMatch],
      responses: { '200': json('CapReply', 'The cap', tag), ...notModified, ...noRecord, ...refusals },
    },
  },
  '/v1/assessments/{id}/changes': {
    get: {
      operationId: 'listChanges',
      summary:
        'What differs from another revision: verdicts that turned, caps and what governs them, inputs by pointer',
      tags: ['records'],
      parameters: [
        id,
        query('since', 'Id of another revision of the project; without it the one right before'),
        ifNoneMatch,
      ],
      responses: { '200': json('ChangesReply', 'The changes', tag), ...notModified, ...noRecord, ...refusals, ...late },
    },
  },
  '/v1/assessments/{id}/signatures': {
    get: {
      operationId: 'listSignatures',
      summary: 'Signatures of a record, in their order',
      tags: ['records'],
      parameters: [id],
      responses: { '200': json('SignatureList', 'The signatures'), ...noRecord, ...refusals },
    },
    post: {
      operationId: 'signAssessment',
      summary: 'Sign a record: originator, then checker, then approver, three people',
      tags: ['records'],
      parameters: [id],
      requestBody: body('SignatureRequest', { role: 'originator', meaning: 'Prepared by me from the model of 4 May' }),
      responses: {
        '201': json('Signature', 'The signature'),
        '400': problem('The body cannot be read'),
        ...noRecord,
        '409': problem('Another role is next, or this person signed before'),
        '415': problem('The content type is not accepted'),
        ...refusals,
      },
    },
  },
  '/v1/assessments/{id}/reverify': {
    post: {
      operationId: 'reverifyAssessment',
      summary: 'Compute a record again with the running engine',
      tags: ['records'],
      parameters: [id],
      responses: {
        '200': json('ReverifyReply', 'Identical, or what changed'),
        ...noRecord,
        '409': problem('The running engine refuses the stored request'),
        ...refusals,
        ...late,
      },
    },
  },
})
