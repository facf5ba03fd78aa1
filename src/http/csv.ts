/** A text that a spreadsheet would run as a formula gets an apostrophe before it. */
const harmless = (text: string) => (/^[=+\-@\t\r\n]/.test(text) ? `'${text}` : text)
const quoted = (text: string) => (/[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text)
const cell = (value: unknown) =>
  typeof value === 'string' ? quoted(harmless(value)) : value === null ? '' : String(value)

/** Rows of one shape as CSV with a header (RFC 4180). */
export function csvOf(rows: readonly Readonly<Record<string, unknown>>[]): string {
  const columns = Object.keys(rows[0] ?? {})
  return [columns, ...rows.map((row) => columns.map((column) => row[column]))]
    .map((cells) => `${cells.map(cell).join(',')}\r\n`)
    .join('')
}
