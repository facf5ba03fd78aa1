import type { Job } from '../store/jobs.ts'

/** An assessment that is no record yet, or never will be, as the contract shows it. */
export const showJob = (job: Job) => ({
  id: job.id,
  project: job.project,
  state: job.state,
  createdAt: job.created_at,
  startedAt: job.started_at,
  finishedAt: job.finished_at,
  actor: job.actor,
  actorKey: job.actor_key,
  attempts: job.attempts,
  progress: { done: job.done, caps: job.caps },
  // The trace id finds the lines of the log that belong to it, as in any other problem.
  ...(job.problem !== null && { problem: { ...JSON.parse(job.problem), traceId: job.trace_id } }),
})
export type ShownJob = ReturnType<typeof showJob>
