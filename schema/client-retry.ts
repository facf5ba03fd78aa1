export type Patience = {
  /** How often a request is sent again. */
  readonly retries: number
  readonly fetch: typeof fetch
}

export const waitSeconds = (seconds: number) => new Promise((resolve) => setTimeout(resolve, seconds * 1000))

/**
 * fetch that tries again: where the service is busy (503), the first request with the same Idempotency-Key still runs (409), or
 * nobody answered. Every request of the client may be sent twice: the calculators are pure, stored assessments carry an
 * Idempotency-Key, PUT sets a value, what is cancelled stays so, and a signature stands
 * only once.
 */
export function patient({ retries, fetch }: Patience): (request: Request) => Promise<Response> {
  return async (request) => {
    for (let left = retries; ; left--) {
      let reply: Response | undefined
      try {
        reply = await fetch(request.clone())
      } catch (fault) {
        if (left <= 0) throw fault
      }
      if (reply && (left <= 0 || !again(request, reply.status))) return reply
      // Seconds; a date would be read as none.
      const seconds = Number(reply?.headers.get('retry-after') ?? 1)
      await waitSeconds(Number.isFinite(seconds) ? seconds : 1)
    }
  }
}

const again = (request: Request, status: number) =>
  status === 503 || (status === 409 && request.headers.has('idempotency-key'))
