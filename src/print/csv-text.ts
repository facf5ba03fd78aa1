/**
 * A text as a cell of CSV (RFC 4180). One that a spreadsheet would read as a formula gets an apostrophe in front, also after
 * leading blanks, which spreadsheets skip; numbers of our own are never texts.
 */
export function csvText(value: string): string {
  const safe = /^\s*[=+\-@]|^[\t\r\n]/.test(value) ? `'${value}` : value
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe
}
