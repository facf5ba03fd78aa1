import { get } from 'node:http'
import { scheduleBody } from './bodies.ts'
import { type Finding, quantile, time } from './measure.ts'
import { assess, serve } from './service-process.ts'

const WORKERS = 2
/** The largest schedule that the limits of the service admit and that runs for some seconds in one thread. */
const [CAPS, COMBINATIONS] = [5000, 100]
const PROBES = 400
const PAUSE = 20

/** Microseconds of one GET over a connection of its own. */
const probe = (url: string): Promise<number> =>
  new Promise((resolve, reject) => {
    const start = process.hrtime.bigint()
    get(url, { agent: false }, (response) => {
      response.resume().on('end', () => resolve(Number(process.hrtime.bigint() - start) / 1e3))
    }).on('error', reject)
  })

const pause = (ms: number) => new Promise((resolve) => setTimeout(resolve, ms))

/** (e) Latency of `GET /livez` while large assessments keep every worker thread busy. */
export async function probeUnderLoad(): Promise<Finding[]> {
  const { url, stop } = await serve({ WORKERS: String(WORKERS) })
  const body = JSON.stringify(scheduleBody(CAPS, COMBINATIONS))
  let open = true
  const seconds: number[] = []
  const keepBusy = async () => {
    while (open) {
      const start = performance.now()
      const status = await assess(url, body)
      if (status !== 200) throw new Error(`assessment: ${status}`)
      seconds.push((performance.now() - start) / 1e3)
    }
  }
  const series = async () => {
    const all: number[] = []
    for (let i = 0; i < PROBES; i++) {
      all.push(await probe(`${url}/livez`))
      await pause(PAUSE)
    }
    return all
  }
  try {
    const idle = await series()
    const work = Promise.all(Array.from({ length: WORKERS }, keepBusy))
    const loaded = await series()
    open = false
    await work
    const [p99, most] = [quantile(loaded, 0.99), Math.max(...loaded)]
    const megabytes = (body.length / 1e6).toFixed(0)
    return [
      { part: 'e', what: 'GET /livez, p99, idle', value: time(quantile(idle, 0.99)) },
      {
        part: 'e',
        what: `GET /livez, p99, ${WORKERS} workers on ${megabytes} MB schedules`,
        value: `${time(p99)}; most ${time(most)}; ${seconds.length} runs of ${quantile(seconds, 0.5).toFixed(1)} s`,
        aim: '< 50 ms',
        holds: p99 < 50e3,
      },
    ]
  } finally {
    await stop()
  }
}
