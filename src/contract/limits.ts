/** What one request may hold. Listed at GET /v1/limits. */
export const limits = { layers: 200, pilesPerCap: 2500, caps: 5000, rows: 500_000 } as const
/** A client of `Prefer: respond-async, wait=N` waits at most so long, s: proxies end longer requests. */
export const LONGEST_WAIT = 60
