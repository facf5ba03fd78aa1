import swagger from '@fastify/swagger'
import swaggerUi from '@fastify/swagger-ui'
import type { FastifyInstance } from 'fastify'

/** Nothing from elsewhere, no inline script; the page sets styles on its own elements. */
const CSP =
  "default-src 'none'; script-src 'self'; style-src 'self' 'unsafe-inline'; img-src 'self' data:; connect-src 'self'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'"
const LOGO =
  '<svg xmlns="http://www.w3.org/2000/svg" width="150" height="40"><text x="0" y="28" font-family="Georgia, serif" font-size="26" fill="#fff">Kentledge</text></svg>'

/** `/openapi.json` and the reference page `/reference`, which needs no network: all it loads comes from this service. */
export async function reference(app: FastifyInstance, { document }: { readonly document: object }): Promise<void> {
  const text = JSON.stringify(document)
  await app.register(swagger, { mode: 'static', specification: { document: document as never } })
  await app.register(swaggerUi, {
    routePrefix: '/reference',
    staticCSP: CSP,
    theme: { title: 'Kentledge, API reference' },
    logo: { type: 'image/svg+xml', content: Buffer.from(LOGO), href: '/reference/', target: '_self' },
    uiConfig: { docExpansion: 'list', tryItOutEnabled: true },
  })
  app.get('/openapi.json', async (_, reply) => reply.type('application/json; charset=utf-8').send(text))
}
