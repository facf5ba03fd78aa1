/** All that the engine can refuse, with the facts that a message needs. Knows no HTTP. */

export type FaultCode =
  | 'wrong-dimension'
  | 'unknown-unit'
  | 'not-a-number'
  | 'unknown-method'
  | 'method-not-applicable'
  | 'missing-parameter'
  | 'no-layer'
  | 'missing-thickness'
  | 'pile-below-known-ground'
  | 'toe-in-uncovered-soil'
  | 'section-impossible'
  | 'piles-overlap'
  | 'piles-too-close'
  | 'load-beyond-resistance'
  | 'too-many-piles'
  | 'unknown-reference'
  | 'duplicate-mark'
  | 'duplicate-row'
  | 'missing-combination'
  | 'missing-load'
  | 'limit-state-mismatch'
  | 'line-cannot-take-moment'
  | 'no-design-basis-support'
  | 'wrong-load-components'
  | 'not-finite'

/** One fault: where (JSON Pointer into the request), what, and the numbers as data. */
export type Fault = {
  readonly pointer: string
  readonly code: FaultCode
  readonly facts: Readonly<Record<string, string | number | readonly string[]>>
}

/** Thrown by the engine; carries every fault that was found together. */
export class EngineFault extends Error {
  readonly faults: readonly Fault[]
  constructor(faults: readonly Fault[]) {
    super(faults.map((f) => `${f.code} at ${f.pointer || '/'}`).join('; '))
    this.name = 'EngineFault'
    this.faults = faults
  }
}

/** Refuses with a single fault. */
export function refuse(code: FaultCode, pointer: string, facts: Fault['facts'] = {}): never {
  throw new EngineFault([{ code, pointer, facts }])
}

/** Works on each item. Where some refuse, all the others are still tried, and one refusal carries the faults of all. */
export function eachOf<T, R>(items: readonly T[], work: (item: T, index: number) => R): R[] {
  const done: R[] = []
  const faults = new Map<string, Fault>()
  for (const [index, item] of items.entries()) {
    try {
      done.push(work(item, index))
    } catch (refusal) {
      if (!(refusal instanceof EngineFault)) throw refusal
      for (const fault of refusal.faults) faults.set(JSON.stringify(fault), fault)
    }
  }
  if (faults.size > 0) throw new EngineFault([...faults.values()])
  return done
}
