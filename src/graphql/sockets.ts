import websocket from '@fastify/websocket'
import type { FastifyInstance } from 'fastify'
import { limits } from './limits.ts'

/**
 * Lets routes take websockets. It comes before whatever refuses requests and before all routes: only then the socket of a
 * refused upgrade is ended, and no other route takes one.
 */
export async function sockets(app: FastifyInstance): Promise<void> {
  await app.register(websocket, { options: { maxPayload: 2 * limits.characters } })
}
