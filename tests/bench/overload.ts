import { scheduleBody } from './bodies.ts'
import { type Finding, median, quantile, time } from './measure.ts'
import { assess, serve } from './service-process.ts'

const WORKERS = 2
const QUEUE = 4
const SECONDS = 5
const LOAD = 4

type Reply = { readonly status: number; readonly us: number }

/** (e) What is left of the throughput when four times as much comes in, and how fast the rest is refused. */
export async function overload(): Promise<Finding[]> {
  const { url, stop } = await serve({ WORKERS: String(WORKERS), WORK_QUEUE: String(QUEUE) })
  const body = JSON.stringify(scheduleBody(100, 20))
  const ask = async (): Promise<Reply> => {
    const start = performance.now()
    const status = await assess(url, body)
    return { status, us: (performance.now() - start) * 1e3 }
  }
  /** As many clients as the service takes, each asking again when it was answered. */
  const closed = async () => {
    let answered = 0
    const until = performance.now() + SECONDS * 1e3
    const client = async () => {
      while (performance.now() < until) if ((await ask()).status === 200) answered++
    }
    await Promise.all(Array.from({ length: WORKERS + QUEUE }, client))
    return answered / SECONDS
  }
  /** Requests at a fixed rate, whether or not the earlier ones have been answered. */
  const open = async (rate: number) => {
    const replies: Promise<Reply>[] = []
    const start = performance.now()
    while (performance.now() - start < SECONDS * 1e3) {
      while (replies.length < ((performance.now() - start) / 1e3) * rate) replies.push(ask())
      await new Promise((resolve) => setTimeout(resolve, 2))
    }
    return Promise.all(replies)
  }
  try {
    await closed()
    const goodput: number[] = []
    const refused: number[] = []
    const peaks: number[] = []
    for (let round = 0; round < 3; round++) {
      const peak = await closed()
      const replies = await open(LOAD * peak)
      peaks.push(peak)
      goodput.push(replies.filter((r) => r.status === 200).length / SECONDS / peak)
      refused.push(...replies.filter((r) => r.status === 503).map((r) => r.us))
      const other = replies.find((r) => r.status !== 200 && r.status !== 503)
      if (other) throw new Error(`overload: status ${other.status}`)
    }
    const [mid, p99] = [median(refused), quantile(refused, 0.99)]
    return [
      {
        part: 'e',
        what: `goodput at ${LOAD} times the load : peak`,
        value: `${median(goodput).toFixed(2)} (peak ${Math.round(median(peaks))} a second)`,
        aim: '>= 0.8',
        holds: median(goodput) >= 0.8,
      },
      {
        part: 'e',
        what: `503 at ${LOAD} times the load, p99`,
        value: `${time(p99)}; median ${time(mid)}; ${refused.length} refused`,
        aim: '<= 20 ms',
        holds: p99 <= 20e3,
      },
    ]
  } finally {
    await stop()
  }
}
