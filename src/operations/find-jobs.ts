import type { Actor } from '../store/actor.ts'
import { countJobsOf, findJobs as find, type JobFilter } from '../store/find-jobs.ts'
import type { Page } from '../store/page.ts'
import { listName } from './cursors.ts'
import type { Office } from './office.ts'
import { showJob } from './show-job.ts'

export type { JobFilter }

export const jobList = (filter: JobFilter): string => listName('jobs', '', filter)

/** Assessments that are no records, of every project that the actor has a right to. */
export const findJobs = async ({ store }: Office, actor: Actor, filter: JobFilter, page: Page<string>) =>
  (await find(store, actor, filter, page)).map(showJob)

export const countJobs = ({ store }: Office, actor: Actor, filter: JobFilter): Promise<number> =>
  countJobsOf(store, actor, filter)
