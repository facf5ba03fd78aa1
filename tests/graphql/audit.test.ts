import Fastify from 'fastify'
import { serverAudits } from 'graphql-http'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { graphqlPlugin } from '../../src/graphql/plugin.ts'
import { anonymous } from '../../src/store/actor.ts'
import { emptyOffice } from './office.ts'

const app = Fastify()
let url = ''
beforeAll(async () => {
  await graphqlPlugin(app, { production: false, actorOf: () => anonymous, office: await emptyOffice() })
  url = `${await app.listen({ port: 0, host: '127.0.0.1' })}/graphql`
})
afterAll(() => app.close())

test('every audit of GraphQL over HTTP passes', async () => {
  const audits = serverAudits({ url: () => url })
  const failed: string[] = []
  for (const { id, name, fn } of audits) {
    const result = await fn()
    if (result.status !== 'ok') failed.push(`${id} ${name}: ${result.reason}`)
  }
  console.log(`GraphQL over HTTP: ${audits.length - failed.length} of ${audits.length} audits passed`)
  expect(failed).toEqual([])
  // As many as version 1.22.4 of graphql-http holds: none is dropped in silence.
  expect(audits).toHaveLength(60)
})
