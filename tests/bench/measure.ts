/** How the bench measures: interleaved repetitions, so that a noisy machine disturbs all cases alike, and medians. */

/** One line of the table. `holds` is undefined where there is no aim. */
export type Finding = {
  readonly part: string
  readonly what: string
  readonly value: string
  readonly aim?: string
  readonly holds?: boolean
}

export const sorted = (values: readonly number[]): number[] => [...values].sort((a, b) => a - b)
export const quantile = (values: readonly number[], share: number): number =>
  sorted(values)[Math.min(values.length - 1, Math.floor(values.length * share))] ?? Number.NaN
export const median = (values: readonly number[]): number => quantile(values, 0.5)

/** What a bench computes is added up and printed, so that no call can be left out as unused. */
export const sink = { sum: 0 }

/** CPU of this process in microseconds, all its threads: what waiting and other processes cost is not in it. */
function cpuOf(run: () => void): number {
  const before = process.cpuUsage()
  run()
  const { user, system } = process.cpuUsage(before)
  return user + system
}

export type Case = { readonly calls: number; readonly run: () => number }

/**
 * CPU of one call of each case in microseconds, one value a round; the cases take turns in every round.
 * The first `warmUp` rounds compile the code and are not counted.
 */
export function interleaved<K extends string>(
  cases: Readonly<Record<K, Case>>,
  rounds: number,
  warmUp: number,
): Record<K, number[]> {
  const names = Object.keys(cases) as K[]
  const out = Object.fromEntries(names.map((name) => [name, [] as number[]])) as Record<K, number[]>
  for (let round = -warmUp; round < rounds; round++) {
    for (const name of names) {
      const { calls, run } = cases[name]
      const cpu = cpuOf(() => {
        for (let i = 0; i < calls; i++) sink.sum += run()
      })
      if (round >= 0) out[name].push(cpu / calls)
    }
  }
  return out
}

/** The median over the rounds of a ratio of two cases: both halves of each ratio were measured side by side. */
export const ratio = (above: readonly number[], below: readonly number[]): number =>
  median(above.map((a, i) => a / below[i]!))

export const time = (us: number): string =>
  us < 1
    ? `${(us * 1e3).toFixed(1)} ns`
    : us < 1e4
      ? `${us.toFixed(us < 100 ? 1 : 0)} us`
      : `${(us / 1e3).toFixed(0)} ms`
