import { header, inPath, problem, query } from './openapi-parts.ts'

const slug = inPath('slug', 'The project')
const id = inPath('id', 'The assessment')
const ofPlan = [
  query('check', 'Only this kind of check; the largest of all without'),
  query('since', 'Id or revision of another assessment of the project, laid beside with what changed'),
]
const text = { schema: { type: 'string' } }
const page = (description: string) => ({ description, content: { 'text/html': text } })
const refusals = {
  '401': problem('No valid key'),
  '403': problem('The key lacks a scope'),
  '404': problem('No such record, cap or project, or none that the key has a right to'),
  '406': problem('The route answers in no accepted type'),
  '409': problem('The assessment is not completed'),
  '422': problem('A parameter is invalid'),
  '503': problem('The service or its store is busy or stopping; try again'),
  '504': problem('The work took longer than the service allows'),
}
const get = (operationId: string, summary: string, parameters: readonly object[], answer: object) => ({
  get: { operationId, summary, tags: ['pages'], parameters, responses: { ...answer, ...refusals } },
})
const file = { 'Content-Disposition': header('A name for the file, of project and revision'), ETag: header('Strong') }
const csv = { description: 'One row a pile, every number in full', headers: file, content: { 'text/csv': text } }

/** Paths of the pages of stored records: each is one file, for screen and paper, that asks nobody else. */
export const pagePaths = {
  '/v1/projects/{slug}/plan': get(
    'printPlan',
    'Plan of the newest assessment of a project: all caps with utilisation, settlement and what governs',
    [slug, ...ofPlan],
    { '200': page('The plan') },
  ),
  '/v1/assessments/{id}/sheet': get('printOverview', 'The same plan of one assessment', [id, ...ofPlan], {
    '200': page('The plan'),
  }),
  '/v1/assessments/{id}/caps/{mark}/sheet': get(
    'printCapSheet',
    'Calculation sheet of one cap, with the signatures of the record',
    [id, inPath('mark', 'Mark of the cap')],
    { '200': page('The sheet') },
  ),
  '/v1/assessments/{id}/piles': get('printPiles', 'Schedule of piles, as CSV or as a page', [id], {
    '200': { ...csv, content: { 'text/csv': text, 'text/html': text } },
    '304': { description: 'The client holds the CSV already' },
  }),
  '/v1/assessments/{id}/piles.csv': get('getPilesCsv', 'Schedule of piles as CSV, for links', [id], {
    '200': csv,
    '304': { description: 'The client holds it already' },
  }),
}
