import { parse } from 'csv-parse/sync'
import { Problem, type ProblemError, problemError, problemOf } from '../errors.ts'

const names = ['cap', 'combination'] as const
const components = { pressing: ['V', 'Mx', 'My'], model: ['Fx', 'Fy', 'Fz', 'Mx', 'My', 'Mz'] } as const
/** So many faults are told one by one; a file that is wrong throughout needs no longer list. */
const MOST_FAULTS = 100

/** A decimal number: `Number` alone would also read "0x10" and "". */
const DECIMAL = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i

export type CsvLoads = {
  readonly rows: readonly Readonly<Record<string, string | number>>[]
  /** The line of the file in which each row ends. */
  readonly lines: readonly number[]
}

/**
 * Rows of loads from CSV with a header. Cells become numbers; other columns are refused, and so is a column that stands twice.
 * Throws one problem with every fault, each with its line in the file (the header is line 1) and its column.
 */
export function csvRows(text: string, signs: unknown): CsvLoads {
  const wanted = components[signs === 'pressing' ? 'pressing' : 'model']
  let records: string[][]
  const ends: number[] = []
  try {
    records = parse(text, {
      bom: true,
      skip_empty_lines: true,
      trim: true,
      relax_column_count: true,
      on_record: (record: string[], { lines }) => {
        ends.push(lines)
        return record
      },
    })
  } catch (fault) {
    throw problemOf([problemError('/loads', 'csv-malformed', { reason: (fault as Error).message })])
  }
  const header = records[0] ?? []
  const expected = [...names, ...wanted]
  const faults: ProblemError[] = [
    ...expected
      .filter((c) => !header.includes(c))
      .map((column) =>
        problemError('/loads', 'csv-malformed', {
          reason: `The column ${column} is missing; the header has ${header.join(', ') || 'nothing'}`,
          column,
        }),
      ),
    ...header
      .filter((c) => !(expected as string[]).includes(c))
      .map((column) =>
        problemError('/loads', 'csv-malformed', {
          reason: `The column ${column} is not known; expected ${expected.join(', ')}`,
          column,
        }),
      ),
    ...header
      .filter((c, i) => header.indexOf(c) < i)
      .map((column) =>
        problemError('/loads', 'csv-malformed', { reason: `The column ${column} stands twice in the header`, column }),
      ),
  ]
  if (faults.length > 0) throw problemOf(faults)
  const rows = records.slice(1).map((cells, index) => {
    const line = ends[index + 1]!
    const row: Record<string, string | number> = {}
    for (const [i, column] of header.entries()) {
      const cell = cells[i] ?? ''
      const isName = column === 'cap' || column === 'combination'
      const value = isName ? cell : DECIMAL.test(cell) ? Number(cell) : Number.NaN
      if (cell === '' || (!isName && !Number.isFinite(value))) {
        faults.push(
          problemError(`/loads/rows/${index}/${column}`, 'csv-malformed', {
            reason: `Line ${line}, column ${column}: read "${cell}", expected ${isName ? 'a name' : 'a number'}`,
            line,
            column,
            got: cell,
          }),
        )
      }
      row[column] = value
    }
    if (cells.length !== header.length)
      faults.push(
        problemError(`/loads/rows/${index}`, 'csv-malformed', {
          reason: `Line ${line} has ${cells.length} cells, the header ${header.length}`,
          line,
        }),
      )
    return row
  })
  if (faults.length > 0) throw problemOf(faults.slice(0, MOST_FAULTS))
  return { rows, lines: ends.slice(1) }
}

/** The faults of rows that came as CSV, each with its line and column in the file. */
export function withLines(problem: Problem, lines: readonly number[]): Problem {
  const errors = problem.errors.map((error): ProblemError => {
    const [, index, column] = /^\/loads\/rows\/(\d+)(?:\/(.+))?$/.exec(error.pointer) ?? []
    if (index === undefined) return error
    const line = lines[Number(index)]
    const place = `Line ${line}${column ? `, column ${column}` : ''}`
    const detail = `${place}: ${error.detail}${error.code === 'duplicate-row' ? ` That is line ${lines[Number(error.first) - 1]}.` : ''}`
    return { ...error, line, ...(column && { column }), detail }
  })
  return new Problem(problem.code, problem.facts, errors)
}
