import { AGAIN, type Queue, type RunJob, underWay } from './queue.ts'

/**
 * The queue of a service that alone serves its store: the rows of the jobs are the line. `next` gives the id of the job that
 * has waited longest, but for some; `most` jobs run at once.
 */
export function embeddedQueue(
  next: (but: readonly string[]) => Promise<string | undefined>,
  most: number,
  report: (fault: unknown) => void,
): Queue {
  const jobs = underWay()
  /** Ids that are given out, or wait to be given out again. */
  const out = new Set<string>()
  let run: RunJob | undefined
  let stopped = false
  let looking = false
  let again = false

  const later = (then: () => void) => setTimeout(then, AGAIN * 1000).unref()
  const giveOut = (id: string) => {
    out.add(id)
    void jobs.track(run!(id, jobs.stopping)).then(
      () => {
        out.delete(id)
        wake()
      },
      () =>
        later(() => {
          if (!stopped) giveOut(id)
        }),
    )
  }
  async function look(): Promise<void> {
    while (!stopped && out.size < most) {
      const id = await next([...out])
      if (id === undefined || stopped) return
      giveOut(id)
    }
  }
  /** One look at a time; a wake during it makes another, since it may have come too late for the first. */
  function wake(): void {
    if (!run || stopped) return
    again = true
    if (looking) return
    looking = true
    const all = async () => {
      while (again) {
        again = false
        await look()
      }
    }
    all()
      .catch((fault) => {
        report(fault)
        later(wake)
      })
      .finally(() => {
        looking = false
        if (again) wake()
      })
  }
  return {
    add: async () => undefined,
    wake,
    start: async (given) => {
      run = given
      wake()
    },
    stop: async (ms) => {
      stopped = true
      await jobs.end(ms)
    },
  }
}
