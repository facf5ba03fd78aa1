import { readFile } from 'node:fs/promises'
import type { FastifyInstance, FastifyReply } from 'fastify'
import { pagePolicy } from '../print/page.ts'

/** What routes produce whose answer may be had as a page too. */
export const JSON_OR_PAGE = ['application/json', 'text/html']

/** What goes with every page: its policy, and that it is of no use to others. */
export const pageHeaders = (reply: FastifyReply): FastifyReply =>
  reply
    .header('content-security-policy', pagePolicy)
    .header('x-content-type-options', 'nosniff')
    .header('referrer-policy', 'no-referrer')
    .header('cache-control', 'no-store')
    .type('text/html; charset=utf-8')

/** The scripts that pages load: additions to what is readable without. */
export async function pageScripts(app: FastifyInstance): Promise<void> {
  const plan = await readFile(new URL('../print/plan.js', import.meta.url))
  app.get('/print/plan.js', async (_request, reply) =>
    reply.header('x-content-type-options', 'nosniff').type('text/javascript; charset=utf-8').send(plan),
  )
}
