import swagger from '@fastify/swagger'
import swaggerUi from '@fastify/swagger-ui'
import type { FastifyInstance } from 'fastify'

/** `/openapi.json` and the reference page `/reference`, which needs no network: all it loads comes from this service. */
export async function reference(app: FastifyInstance, { document }: { readonly document: object }): Promise<void> {
  const text = JSON.stringify(document)
  await app.register(swagger, { mode: 'static', specification: { document: document as never } })
  await app.register(swaggerUi, {
    routePrefix: '/reference',
    staticCSP: true,
    uiConfig: { docExpansion: 'list', tryItOutEnabled: true },
  })
  app.get('/openapi.json', async (_, reply) => reply.type('application/json; charset=utf-8').send(text))
}
