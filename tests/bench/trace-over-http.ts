import autocannon from 'autocannon'
import { singlePileBody } from './bodies.ts'
import { type Finding, median, ratio } from './measure.ts'
import { serve } from './service-process.ts'

const ROUNDS = 9
const SECONDS = 1

/** (a) Requests a second of a single pile with its full trace against a route that validates and serialises an equal stored object. */
export async function traceOverHttp(): Promise<Finding[]> {
  const { url, stop } = await serve()
  const body = JSON.stringify(singlePileBody)
  const ask = async (path: string) => {
    const { requests, non2xx, errors } = await autocannon({
      url: url + path,
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body,
      connections: 8,
      duration: SECONDS,
    })
    if (non2xx + errors > 0) throw new Error(`${path}: ${non2xx} refused, ${errors} failed`)
    return requests.total / SECONDS
  }
  try {
    const answers = await Promise.all(['/v1/single-pile', '/bench/stored'].map((path) => post(url + path, body)))
    if (answers[0] !== answers[1]) throw new Error('the stored object is not equal to the answer')
    const traced: number[] = []
    const stored: number[] = []
    // The first round warms up.
    for (let round = 0; round <= ROUNDS; round++) {
      const [own, other] = [await ask('/v1/single-pile'), await ask('/bench/stored')]
      if (round === 0) continue
      traced.push(own)
      stored.push(other)
    }
    const value = ratio(traced, stored)
    return [
      {
        part: 'a',
        what: `POST /v1/single-pile, full trace (${Math.round(answers[0]!.length / 1e3)} kB) : stored object`,
        value: `${value.toFixed(2)} (${Math.round(median(traced))} : ${Math.round(median(stored))} a second)`,
        aim: '>= 0.6',
        holds: value >= 0.6,
      },
    ]
  } finally {
    await stop()
  }
}

const post = async (url: string, body: string): Promise<string> =>
  (await fetch(url, { method: 'POST', headers: { 'content-type': 'application/json' }, body })).text()
