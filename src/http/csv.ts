import { csvText } from '../print/csv-text.ts'

const cell = (value: unknown) => (typeof value === 'string' ? csvText(value) : value === null ? '' : String(value))

/** Rows of one shape as CSV with a header (RFC 4180). */
export function csvOf(rows: readonly Readonly<Record<string, unknown>>[]): string {
  const columns = Object.keys(rows[0] ?? {})
  return [columns, ...rows.map((row) => columns.map((column) => row[column]))]
    .map((cells) => `${cells.map(cell).join(',')}\r\n`)
    .join('')
}
