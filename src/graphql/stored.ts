import { checkKinds } from '../contract/replies.ts'
import { Problem } from '../errors.ts'
import {
  assessmentList,
  countAssessments,
  findAssessments,
  type RecordFilter,
  type RecordOrder,
  type RecordPosition,
  sumAssessments,
  timeOf,
} from '../operations/find-assessments.ts'
import { countJobs, findJobs, type JobFilter, jobList } from '../operations/find-jobs.ts'
import { listChanges } from '../operations/list-changes.ts'
import { countProjects, getProject, listProjects, projectList } from '../operations/list-projects.ts'
import { type CapFilter, type CapPosition, capList } from '../operations/read-caps.ts'
import { type NeighbourPosition, neighbourList } from '../operations/read-many.ts'
import { needScope, ownAssessment, ownRecord } from '../operations/rights.ts'
import { showRecord } from '../operations/show-record.ts'
import { watchJob } from '../operations/watch-job.ts'
import { askedPage, connectionFields, connectionOf } from './connection.ts'
import type { CapConnectionNode } from './nodes.ts'
import { plainInput } from './plain-input.ts'
import type { Resolvers, Trace } from './resolver-types.ts'

/** Arguments without those that are null: clients send null for "not given". */
const given = <T extends object>(args: T) => plainInput(args) as { [K in keyof T]?: NonNullable<T[K]> }

function timed<F extends { from?: string; to?: string }>(filter: F): F {
  const { from, to } = filter
  return { ...filter, ...(from && { from: timeOf('from', from) }), ...(to && { to: timeOf('to', to) }) }
}

function knownCheck(filter: CapFilter): CapFilter {
  const { check } = filter
  if (check !== undefined && !checkKinds.some((kind) => kind === check))
    throw new Problem('bad-query', { field: 'check', expected: checkKinds.join(' or '), got: check })
  return filter
}

async function* mapped<A, B>(events: AsyncIterable<A>, map: (event: A) => B): AsyncGenerator<B> {
  for await (const event of events) yield map(event)
}

/** Fields of Query that read what is stored. */
export const storedQueries = {
  projects: async (_parent, args, { actor, office }) => {
    const { limit, page } = askedPage<string>(projectList, args)
    const rows = (await listProjects(office, actor, page)).map((row) => ({ ...row, position: row.slug }))
    return connectionOf(projectList, rows, limit, () => countProjects(office, actor))
  },
  project: async (_parent, { slug }, { actor, office }) => (await getProject(office, actor, slug)).project,
  assessments: async (_parent, args, { actor, office }) => {
    const { first, after, order = 'oldest', ...rest } = given(args)
    const filter: RecordFilter = timed(rest)
    const list = assessmentList(filter, order)
    const { limit, page } = askedPage<RecordPosition>(list, { first, after })
    const rows = await findAssessments(office, actor, filter, order, page)
    const total = () => countAssessments(office, actor, filter)
    return { ...connectionOf(list, rows, limit, total), sums: () => sumAssessments(office, actor, filter) }
  },
  assessment: async (_parent, { id }, { actor, office }) => showRecord(await ownRecord(office, actor, id)),
  jobs: async (_parent, args, { actor, office }) => {
    const { first, after, ...rest } = given(args)
    const filter: JobFilter = timed(rest)
    const list = jobList(filter)
    const { limit, page } = askedPage<string>(list, { first, after })
    const rows = (await findJobs(office, actor, filter, page)).map((row) => ({ ...row, position: row.id }))
    return connectionOf(list, rows, limit, () => countJobs(office, actor, filter))
  },
} satisfies Resolvers['Query']

export const storedSubscriptions = {
  assessmentProgress: {
    subscribe: async (_parent, { id }, { actor, office }) => {
      needScope(actor, 'read')
      // Refused before the stream begins: within it a refusal would end the socket.
      await ownAssessment(office, actor, id)
      return mapped(watchJob(office, actor, id), (assessmentProgress) => ({ assessmentProgress }))
    },
  },
} satisfies Resolvers['Subscription']

/** Fields of what is stored that are asked for apart. */
export const storedTypes = {
  ProjectConnection: connectionFields(),
  JobConnection: connectionFields(),
  Job: {
    projectSlug: ({ project }) => project,
    done: ({ progress }) => progress.done,
    caps: ({ progress }) => progress.caps,
  },
  AssessmentConnection: { ...connectionFields(), aggregates: ({ sums }) => sums() },
  CapConnection: connectionFields(),
  NeighbourConnection: connectionFields(),
  Project: {
    latest: ({ slug, revision }, _args, { loaders }) => (revision === 0 ? null : loaders.latest.load(slug)),
    assessments: async ({ slug }, args, { loaders }) => {
      const { first, after, order = 'oldest', ...rest } = given(args)
      const filter = timed(rest)
      const list = assessmentList({ ...filter, project: slug }, order as RecordOrder)
      const { limit, page } = askedPage<RecordPosition>(list, { first, after })
      const rows = await loaders.assessments.load({ of: slug, args: { filter, order, page } })
      const total = () => loaders.assessmentCount.load({ of: slug, args: filter })
      const sums = () => loaders.assessmentSums.load({ of: slug, args: filter })
      return { ...connectionOf(list, rows, limit, total), sums }
    },
  },
  Assessment: {
    projectSlug: ({ project }) => project,
    project: ({ project }, _args, { loaders }) => loaders.project.load(project),
    previous: ({ project, revision }, _args, { loaders }) =>
      revision === 1 ? null : loaders.revision.load({ project, revision: revision - 1 }),
    next: ({ project, revision }, _args, { loaders }) => loaders.revision.load({ project, revision: revision + 1 }),
    caps: async ({ id }, args, { loaders }): Promise<CapConnectionNode> => {
      const { first, after, order = 'schedule', ...rest } = given(args)
      const filter = knownCheck(rest)
      const list = capList(id, filter, order)
      const { limit, page } = askedPage<CapPosition>(list, { first, after })
      const rows = await loaders.caps.load({ of: id, args: { filter, order, page } })
      return connectionOf(list, rows, limit, () => loaders.capCount.load({ of: id, args: filter }))
    },
    cap: ({ id }, { mark }, { loaders }) => loaders.cap.load({ record: id, mark }),
    neighbours: async ({ id }, args, { loaders }) => {
      const { first, after, order = 'schedule', ...filter } = given(args)
      const list = neighbourList(id, filter, order)
      const { limit, page } = askedPage<NeighbourPosition>(list, { first, after })
      const rows = await loaders.neighbours.load({ of: id, args: { filter, order, page } })
      return connectionOf(list, rows, limit, () => loaders.neighbourCount.load({ of: id, args: filter }))
    },
    signatures: ({ id }, _args, { loaders }) => loaders.signatures.load(id),
    changes: async ({ id }, { since, first }, { actor, office }) => {
      const { limit } = askedPage('', { first })
      const { compute } = await listChanges(office, actor, id, since ?? undefined)
      return JSON.parse(Buffer.from(await compute(limit, new AbortController().signal)).toString())
    },
    aggregates: ({ id }) => ({ record: id }),
  },
  CapAggregates: {
    byCheck: ({ record }, _args, { loaders }) => loaders.byCheck.load(record),
    byGround: ({ record }, _args, { loaders }) => loaders.byGround.load(record),
    byPileType: ({ record }, _args, { loaders }) => loaders.byPileType.load(record),
  },
  Cap: {
    checks: ({ assessment, ordinal }, _args, { loaders }) => loaders.checks.load({ record: assessment, cap: ordinal }),
    trace: async ({ assessment, ordinal }, _args, { loaders }) =>
      (await loaders.trace.load({ record: assessment, cap: ordinal })) as Trace | null,
  },
} satisfies Resolvers
