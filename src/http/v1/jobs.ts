import { Readable } from 'node:stream'
import type { FastifyInstance } from 'fastify'
import { cancelAssessment } from '../../operations/cancel-assessment.ts'
import type { Office } from '../../operations/office.ts'
import { isEnded, type JobProgress, watchJob } from '../../operations/watch-job.ts'
import { leaves } from '../leaves.ts'
import { readQuery } from '../query.ts'

type Id = { Params: { id: string } }

/** Progress as server-sent events: `progress` while it goes on, then one named for the state that it ended in. */
async function* events(watched: AsyncIterable<JobProgress>) {
  for await (const progress of watched) {
    const name = isEnded(progress) ? progress.state : 'progress'
    yield `event: ${name}\ndata: ${JSON.stringify(progress)}\n\n`
  }
}

/** Assessments that are under way: watched as a stream, cancelled. */
export function jobs(app: FastifyInstance, office: Office): void {
  // HEAD would wait for the end of the stream.
  const options = { config: { produces: ['text/event-stream'] }, exposeHeadRoute: false }
  app.get<Id>('/v1/assessments/:id/events', options, async (request, reply) => {
    readQuery(request, {})
    const watched = watchJob(office, request.actor!, request.params.id, leaves(reply.raw))
    // What is refused is refused before the stream begins.
    const first = await watched.next()
    async function* all() {
      if (!first.done) yield first.value
      yield* watched
    }
    return reply
      .type('text/event-stream; charset=utf-8')
      .header('cache-control', 'no-store')
      .header('x-accel-buffering', 'no')
      .send(Readable.from(events(all()), { objectMode: false }))
  })
  app.delete<Id>('/v1/assessments/:id', async (request) => {
    readQuery(request, {})
    const job = await cancelAssessment(office, request.actor!, request.params.id)
    request.project = job.project
    return job
  })
}
