import { refuse } from '../faults.ts'
import { quantityKind } from '../quantities/quantity-kind.ts'
import type { UnitCode } from '../quantities/units.ts'
import type { Citation } from '../sources/source.ts'
import type { Formula, TermsOf } from './formula.ts'
import { joined, plain } from './plain-string.ts'
import type { OperandLine, RangeLine, SolutionTable, Step } from './step.ts'
import type { Term } from './term.ts'

export type Labelled<U extends UnitCode> = { readonly symbol: string; readonly name: string; readonly unit: U }
export type Solution<U extends UnitCode> = Labelled<U> & {
  readonly value: number
  readonly method: string
  readonly operands: readonly Term[]
  readonly unknowns: readonly { readonly symbol: string; readonly value: number; readonly unit: UnitCode }[]
  readonly residuals: readonly { readonly name: string; readonly value: number }[]
  readonly tolerance: number
  readonly mesh?: readonly number[]
  readonly table?: SolutionTable
  readonly source: Citation
}

/** What all recorders of one computation share: the steps and their ids. Absent on a silent sheet. */
type Book = { readonly steps: Step[]; readonly seen: Map<string, Term> }

const line = (t: Term, symbol: string): OperandLine => ({ symbol, value: t.value, unit: t.unit, from: t.from })
const ownLine = (t: Term): OperandLine => line(t, t.symbol)

/**
 * The recorder. The engine computes through it, so the trace is the computation.
 * A silent sheet keeps no steps; the code that computes is the same. Ids are unique: a second use of one is a defect and throws.
 */
export class Sheet {
  readonly #book: Book | undefined
  readonly #prefix: string

  private constructor(book: Book | undefined, prefix: string) {
    this.#book = book
    this.#prefix = prefix
  }

  static recording(): Sheet {
    return new Sheet({ steps: [], seen: new Map() }, '')
  }

  static readonly silent: Sheet = new Sheet(undefined, '')

  get records(): boolean {
    return this.#book !== undefined
  }

  get steps(): readonly Step[] {
    return this.#book?.steps ?? []
  }

  /** The same recorder, its ids beginning with `part/`. */
  within(part: string): Sheet {
    return this.#book ? new Sheet(this.#book, `${this.#prefix}${part}/`) : this
  }

  /** A value of the request. Asked for twice (same id), it stays one step. */
  input<const U extends UnitCode>(label: Labelled<U>, value: number, pointer: string, id = label.symbol): Term<U> {
    if (!this.#book) return this.#term(label.symbol, label.unit, value, '')
    const full = joined(this.#prefix, id)
    const known = this.#known(full, label.unit, value)
    if (known) return known
    const { unit } = label
    const symbol = plain(label.symbol)
    const term = this.#term(symbol, unit, value, full)
    const [name, quantity, from] = [plain(label.name), quantityKind(unit), plain(pointer)]
    this.#keep({ id: full, kind: 'input', symbol, name, value, unit, quantity, from }, term)
    return term
  }

  /** A default: a value that nobody gave, with the reason why it is used. */
  assumed<const U extends UnitCode>(
    label: Labelled<U>,
    value: number,
    why: string,
    source: Citation,
    id = label.symbol,
  ): Term<U> {
    if (!this.#book) return this.#term(label.symbol, label.unit, value, '')
    const full = joined(this.#prefix, id)
    const known = this.#known(full, label.unit, value)
    if (known) return known
    const { unit } = label
    const symbol = plain(label.symbol)
    const term = this.#term(symbol, unit, value, full)
    const [name, quantity, reason] = [plain(label.name), quantityKind(unit), plain(why)]
    this.#keep({ id: full, kind: 'input', symbol, name, value, unit, quantity, default: true, reason, source }, term)
    return term
  }

  /** The term that was given under this id before, by the same value. */
  #known<U extends UnitCode>(full: string, unit: U, value: number): Term<U> | undefined {
    const known = this.#book!.seen.get(full)
    if (known && (known.value !== value || known.unit !== unit))
      throw new Error(`step ${full} is recorded twice, with two values`)
    return known as Term<U> | undefined
  }

  /** Evaluates a declared formula. The compiler demands the operands of `where`; a wrong unit is refused. */
  step<W extends Record<string, UnitCode>, U extends UnitCode>(
    f: Formula<W, U>,
    operands: TermsOf<W>,
    id: string = f.symbol,
  ): Term<U> {
    const value = f.evaluate(operands)
    const { symbol, unit } = f
    if (!this.#book) return this.#term(symbol, unit, value, '')
    const { name, source } = f
    const full = joined(this.#prefix, id)
    const term = this.#term(symbol, unit, value, full)
    const kind = 'formula'
    const lines: OperandLine[] = []
    for (const operand of f.names) lines.push(line(operands[operand as keyof W], operand))
    const quantity = quantityKind(unit)
    this.#keep(
      f.range
        ? {
            ...{ id: full, kind, symbol, name, formula: f.text, operands: lines, value, unit, quantity, source },
            range: rangeLines(f, operands),
          }
        : { id: full, kind, symbol, name, formula: f.text, operands: lines, value, unit, quantity, source },
      term,
    )
    return term
  }

  /** Adds terms of one unit. */
  sum<const U extends UnitCode>(label: Labelled<U>, parts: readonly Term<U>[], id = label.symbol): Term<U> {
    let value = 0
    for (const part of parts) value += part.value
    return this.#combined(label, value, parts, id, { kind: 'sum' })
  }

  /** Takes the smallest or largest of several candidates and keeps them all. */
  choice<const U extends UnitCode>(
    label: Labelled<U>,
    rule: 'smallest' | 'largest',
    candidates: readonly Term<U>[],
    id = label.symbol,
  ): Term<U> {
    const best = candidates.reduce((a, b) => ((rule === 'smallest' ? b.value < a.value : b.value > a.value) ? b : a))
    return this.#combined(label, best.value, candidates, id, { kind: 'choice', rule, chosen: best.from })
  }

  /** Reads a table (rows in rising order of their argument), linear between rows, held at the ends; the bracketing rows are kept. */
  lookup<const U extends UnitCode>(
    label: Labelled<U>,
    table: readonly (readonly [number, number])[],
    argument: Term,
    source: Citation,
    id = label.symbol,
  ): Term<U> {
    const rows = bracket(table, argument.value)
    const [low, high = low] = rows
    const span = high![0] - low![0]
    const value = span === 0 ? low![1] : low![1] + ((high![1] - low![1]) * (argument.value - low![0])) / span
    return this.#combined(label, value, [argument], id, { kind: 'lookup', rows, source })
  }

  /** Records the outcome of a numerical solve. */
  solution<const U extends UnitCode>(s: Solution<U>, id = s.symbol): Term<U> {
    const { method, unknowns, residuals, tolerance, mesh, table, source } = s
    return this.#combined(s, s.value, s.operands, id, {
      ...{ kind: 'solution', method, unknowns, residuals, tolerance },
      ...(mesh && { mesh }),
      ...(table && { table }),
      source,
    })
  }

  #combined<U extends UnitCode>(
    label: Labelled<U>,
    value: number,
    parts: readonly Term[],
    id: string,
    // biome-ignore lint/suspicious/noExplicitAny: the rest of a step is fixed by its kind at each call above
    rest: any,
  ): Term<U> {
    const { unit } = label
    if (!this.#book) return this.#term(label.symbol, unit, value, '')
    const full = joined(this.#prefix, id)
    const symbol = plain(label.symbol)
    const term = this.#term(symbol, unit, value, full)
    this.#keep(
      {
        id: full,
        symbol,
        name: plain(label.name),
        operands: parts.map(ownLine),
        value,
        unit,
        quantity: quantityKind(unit),
        ...rest,
      },
      term,
    )
    return term
  }

  #term<U extends UnitCode>(symbol: string, unit: U, value: number, from: string): Term<U> {
    // JSON would print a NaN as null; the engine never lets one out.
    if (!Number.isFinite(value)) refuse('not-finite', '', { symbol })
    return { value, unit, symbol, from }
  }

  #keep(step: Step, term: Term): void {
    const book = this.#book!
    if (book.seen.has(step.id)) throw new Error(`step ${step.id} is recorded twice`)
    book.seen.set(step.id, term)
    book.steps.push(step)
  }
}

function rangeLines<W extends Record<string, UnitCode>>(f: Formula<W, UnitCode>, operands: TermsOf<W>): RangeLine[] {
  return f.range!.map((r) => {
    const value = operands[r.symbol as keyof W].value
    return { ...r, inside: value >= (r.min ?? -Infinity) && value <= (r.max ?? Infinity) }
  })
}

function bracket(table: readonly (readonly [number, number])[], x: number): readonly (readonly [number, number])[] {
  const above = table.findIndex(([argument]) => argument >= x)
  if (above === -1) return [table.at(-1)!]
  const row = table[above]!
  return above === 0 || row[0] === x ? [row] : [table[above - 1]!, row]
}
