import { readFileSync } from 'node:fs'
import { csvRows } from '../../src/contract/csv-loads.ts'
import { parse } from '../../src/contract/parse.ts'
import { scheduleRequest } from '../../src/contract/schedule.ts'
import type { Schedule } from '../../src/engine/assessment/schedule.ts'
import { assess, engineVersion } from '../../src/engine/index.ts'
import type { AssessmentRecord, Issue } from '../../src/print/record.ts'

const example = (name: string) => readFileSync(new URL(`../../schema/examples/${name}`, import.meta.url), 'utf8')
export const exampleBody = (name: string) => JSON.parse(example(`${name}.json`)) as Record<string, unknown>

/** The schedule of the demo with its loads, as it is posted. */
// biome-ignore lint/suspicious/noExplicitAny: tests change any part of it
export function demoBody(): any {
  const body = JSON.parse(example('demo-schedule.json'))
  body.loads.rows = csvRows(example('demo-loads.csv'), body.loads.signs).rows
  return body
}

export const issue: Issue = {
  project: { slug: 'river-quay', title: 'River quay warehouse' },
  revision: 3,
  id: 'a-3',
  actor: 'model exporter',
  createdAt: '2026-11-30T09:12:44Z',
  contentHash: `sha256:${'a1b2'.repeat(16)}`,
  recordHash: `sha256:${'9f3c'.repeat(16)}`,
  engine: engineVersion,
  signatures: [{ role: 'originator', actor: 'M. Ortiz', signedAt: '2026-11-30T14:02:00Z' }],
}

export function recordOf(body: unknown = demoBody(), own: Partial<Issue> = {}): AssessmentRecord {
  const schedule: Schedule = parse(scheduleRequest, body)
  return { ...issue, ...own, schedule, reply: assess(schedule, { trace: true }) }
}
