import type { assess } from '../assess.ts'
import { pairsBy } from './changed-inputs.ts'
import type { Pointers } from './leaves.ts'

export type AssessmentResult = ReturnType<typeof assess>['result']
type Cap = AssessmentResult['caps'][number]
type Neighbours = AssessmentResult['neighbours'][number]

/** A check as it came out: in its governing combination. */
export type Verdict = { readonly combination: string; readonly utilisation: number; readonly satisfied: boolean }
/** Two of a thing; one is left out where there is none. */
export type Sides<T> = { readonly before?: T; readonly after?: T }
export type Turn = 'exceeded' | 'satisfied'

export type CheckChange = Sides<Verdict> & {
  readonly check: string
  /** After less before, of the utilisations. */
  readonly by?: number
}
export type Figure = { readonly before?: number; readonly after?: number; readonly by?: number }
export type CapChange = {
  readonly mark: string
  /** Into the caps of schedule and result. */
  readonly pointer: Required<Pointers>
  /** Only where the verdict of the whole cap turned. */
  readonly turned?: Turn
  /** What governs: the check of the largest utilisation. */
  readonly governing: Sides<Verdict & { readonly check: string }>
  readonly governingChanged: boolean
  readonly by?: number
  /** Those that changed. */
  readonly checks: readonly CheckChange[]
  /** Largest over the combinations, mm; kN/m. Only where they changed. */
  readonly settlement?: Figure
  readonly verticalStiffness?: Figure
}
/** A cap on one side only. */
export type LoneCap = {
  readonly mark: string
  readonly pointer: string
  readonly exceeded: boolean
  readonly governing?: Verdict & { readonly check: string }
}
export type NeighbourChange = CheckChange & {
  /** Marks in alphabetical order. */
  readonly a: string
  readonly b: string
  readonly angularDistortion: Figure
}

const difference = (before: number | undefined, after: number | undefined) =>
  before === undefined || after === undefined ? {} : { by: after - before }
const sides = <T>(before: T | undefined, after: T | undefined): Sides<T> => ({
  ...(before !== undefined && { before }),
  ...(after !== undefined && { after }),
})
const figure = (before: number | undefined, after: number | undefined): Figure => ({
  ...sides(before, after),
  ...difference(before, after),
})
const verdictOf = ({ combination, utilisation, satisfied }: Verdict): Verdict => ({
  combination,
  utilisation,
  satisfied,
})
const sameVerdict = (a: Verdict | undefined, b: Verdict | undefined) =>
  a?.combination === b?.combination && a?.utilisation === b?.utilisation && a?.satisfied === b?.satisfied
const largest = (values: readonly number[]) => (values.length === 0 ? undefined : Math.max(...values))

/** What is not checked on one side is not exceeded there. */
export const turnOf = (before: boolean | undefined, after: boolean | undefined): Turn | undefined =>
  (before ?? true) === (after ?? true) ? undefined : (after ?? true) ? 'satisfied' : 'exceeded'

export const governingOf = ({ checks }: Cap) => {
  const first = checks.reduce<Cap['checks'][number] | undefined>(
    (a, b) => (!a || b.utilisation > a.utilisation ? b : a),
    undefined,
  )
  return first && { check: first.check as string, ...verdictOf(first) }
}
export const isSatisfied = (cap: Cap): boolean => cap.checks.every((check) => check.satisfied)

function checkChange(check: string, before: Verdict | undefined, after: Verdict | undefined): CheckChange {
  return {
    check,
    ...sides(before && verdictOf(before), after && verdictOf(after)),
    ...difference(before?.utilisation, after?.utilisation),
  }
}

function capChange(before: Cap, after: Cap, pointer: Required<Pointers>): CapChange | undefined {
  const checks = pairsBy<Cap['checks'][number]>(before.checks, after.checks, (check) => check.check).flatMap((pair) => {
    const [a, b] = [pair.before?.value, pair.after?.value]
    return sameVerdict(a, b) ? [] : [checkChange((b ?? a)!.check, a, b)]
  })
  const settlements = [before, after].map((cap) => largest(cap.settlement.map((s) => s.settlement)))
  const settlement = figure(settlements[0], settlements[1])
  const stiffness = figure(before.stiffness.vertical, after.stiffness.vertical)
  const moved = ({ before, after }: Figure) => before !== after
  if (checks.length === 0 && !moved(settlement) && !moved(stiffness)) return undefined
  const governing = [governingOf(before), governingOf(after)] as const
  const turned = turnOf(isSatisfied(before), isSatisfied(after))
  return {
    mark: after.mark,
    pointer,
    ...(turned && { turned }),
    governing: sides(...governing),
    governingChanged:
      governing[0]?.check !== governing[1]?.check || governing[0]?.combination !== governing[1]?.combination,
    ...difference(governing[0]?.utilisation, governing[1]?.utilisation),
    checks,
    ...(moved(settlement) && { settlement }),
    ...(moved(stiffness) && { verticalStiffness: stiffness }),
  }
}

const loneCap = (cap: Cap, index: number): LoneCap => {
  const governing = governingOf(cap)
  return {
    mark: cap.mark,
    pointer: `/caps/${index}`,
    exceeded: !isSatisfied(cap),
    ...(governing && { governing }),
  }
}

/** Caps by mark: what changed in those of both sides, and those of one. */
export function changedCaps(before: AssessmentResult, after: AssessmentResult) {
  const [caps, added, gone]: [CapChange[], LoneCap[], LoneCap[]] = [[], [], []]
  for (const pair of pairsBy<Cap>(before.caps, after.caps, (cap) => cap.mark)) {
    if (pair.before && pair.after) {
      const pointer = { before: `/caps/${pair.before.index}`, after: `/caps/${pair.after.index}` }
      const change = capChange(pair.before.value, pair.after.value, pointer)
      if (change) caps.push(change)
    } else if (pair.after) added.push(loneCap(pair.after.value, pair.after.index))
    else if (pair.before) gone.push(loneCap(pair.before.value, pair.before.index))
  }
  return { caps, added, gone }
}

/** Pairs by their marks, in whichever order they stand. */
export function changedNeighbours(before: AssessmentResult, after: AssessmentResult): NeighbourChange[] {
  const marks = ({ a, b }: Neighbours): [string, string] => (a < b ? [a, b] : [b, a])
  const verdict = (n: Neighbours | undefined): Verdict | undefined =>
    n?.utilisation === undefined
      ? undefined
      : { combination: n.combination, utilisation: n.utilisation, satisfied: n.satisfied! }
  const key = (pair: Neighbours) => JSON.stringify(marks(pair))
  return pairsBy<Neighbours>(before.neighbours, after.neighbours, key).flatMap((pair) => {
    const [one, two] = [pair.before?.value, pair.after?.value]
    const same = one?.angularDistortion === two?.angularDistortion && sameVerdict(verdict(one), verdict(two))
    if (same) return []
    const [a, b] = marks((two ?? one)!)
    return [
      {
        a,
        b,
        ...checkChange('angular-distortion', verdict(one), verdict(two)),
        angularDistortion: figure(one?.angularDistortion, two?.angularDistortion),
      },
    ]
  })
}
