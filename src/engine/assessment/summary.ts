import { statics } from '../sources/bibliography.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { CheckTerms } from './assess-cap.ts'
import type { NeighbourTerms } from './compare-neighbours.ts'
import { idPart } from './places.ts'

type Assessed = { readonly cap: { readonly mark: string }; readonly checks: readonly CheckTerms[] }

/** A check as a dashboard lists it; `neighbour` is the other cap of an angular distortion. */
type Line = {
  readonly cap: string
  readonly neighbour?: string
  readonly check: CheckTerms['check'] | 'angular-distortion'
  readonly combination: string
  readonly utilisation: Term<'1'>
}

const worstOf = (lines: readonly Line[]): Line | undefined =>
  lines.reduce<Line | undefined>((a, b) => (!a || b.utilisation.value > a.utilisation.value ? b : a), undefined)

/**
 * What a schedule comes to: caps by their own checks, the worst check of all, and the same for each kind of check. The
 * angular distortion of two neighbours is a kind too, but counts against neither of the two caps.
 */
export function summary(sheet: Sheet, assessed: readonly Assessed[], neighbours: readonly NeighbourTerms[]) {
  const here = sheet.within('summary')
  const count = (symbol: string, name: string, value: number, at?: string) =>
    here.assumed({ symbol, name, unit: '1' }, value, 'counted', statics('counting'), at)
  const good = assessed.filter((a) => a.checks.every((c) => c.satisfied)).length
  const lines = [
    ...assessed.flatMap(({ cap, checks }) =>
      checks.map(({ check, combination, utilisation }): Line => ({ cap: cap.mark, check, combination, utilisation })),
    ),
    ...neighbours.flatMap(({ a, b, combination, utilisation }): Line[] =>
      utilisation ? [{ cap: a, neighbour: b, check: 'angular-distortion', combination, utilisation }] : [],
    ),
  ]
  const kinds = Map.groupBy(lines, (line) => line.check)
  return {
    caps: count('n', 'number of caps', assessed.length),
    satisfied: count('n_s', 'caps with every check satisfied', good),
    exceeded: count('n_e', 'caps with a check exceeded', assessed.length - good),
    worst: worstOf(lines),
    checks: [...kinds].map(([check, all]) => ({
      ...worstOf(all)!,
      count: count('n', `checks of the kind ${check}`, all.length, `${idPart(check)}/n`),
      exceeded: count(
        'n_e',
        `checks of the kind ${check} that exceed`,
        all.filter((line) => !(line.utilisation.value <= 1)).length,
        `${idPart(check)}/n_e`,
      ),
    })),
  }
}
