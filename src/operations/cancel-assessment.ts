import { Problem } from '../errors.ts'
import { cancelJob } from '../store/jobs.ts'
import type { Office } from './office.ts'
import { type Actor, ownAssessment } from './rights.ts'
import { showJob } from './show-job.ts'

/** Cancels an assessment that waits or runs; one that was cancelled stays so. Throws `no-such-assessment` and `assessment-ended`. */
export async function cancelAssessment(office: Office, actor: Actor, id: string) {
  const before = await ownAssessment(office, actor, id)
  // It may have ended since: then there is nothing to cancel, and what it is now tells why.
  if ('job' in before && (await cancelJob(office.store, id))) office.line.ended('cancelled')
  const found = await ownAssessment(office, actor, id)
  if ('job' in found && found.job.state === 'cancelled') return showJob(found.job)
  throw new Problem('assessment-ended', { id, state: 'job' in found ? found.job.state : 'completed' })
}
