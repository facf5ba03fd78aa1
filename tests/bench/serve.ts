import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { parse } from '../../src/contract/parse.ts'
import { singlePileRequest } from '../../src/contract/requests.ts'
import { calculateSinglePile } from '../../src/operations/calculate-single-pile.ts'
import { singlePileBody } from './bodies.ts'

/** The service, and beside it the route that part (a) measures against: the same validation, the answer from a stored object. */
const app = await buildApp(readConfig({ ...process.env, LOG_LEVEL: 'silent' }))
const stored = JSON.parse(JSON.stringify(calculateSinglePile(singlePileBody, { trace: true })))
app.post('/bench/stored', async (request, reply) => {
  parse(singlePileRequest, request.body)
  return reply.type('application/json; charset=utf-8').send(JSON.stringify(stored))
})
process.send!(await app.listen({ host: '127.0.0.1', port: 0 }))
process.on('disconnect', () => process.exit(0))
