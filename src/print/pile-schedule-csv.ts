import { pileRows } from './pile-rows.ts'
import type { AssessmentRecord } from './record.ts'

const header =
  'mark,pile,type,x [m],y [m],cut-off [m below surface],toe level [m below surface],design load [kN],resistance [kN],utilisation,check,combination'

/** The schedule of piles as CSV (RFC 4180), every number in full. */
export function pileScheduleCsv(record: AssessmentRecord): string {
  const lines = pileRows(record).map((r) =>
    [
      text(r.cap),
      r.pile,
      text(r.type),
      r.x,
      r.y,
      r.cutOff,
      r.toe,
      r.check?.demand ?? '',
      r.check?.resistance ?? '',
      r.check?.utilisation ?? '',
      r.check?.check ?? '',
      text(r.check?.combination ?? ''),
    ].join(','),
  )
  return [header, ...lines, ''].join('\r\n')
}

/**
 * A text as a cell. One that a spreadsheet would read as a formula gets an apostrophe in front, also after leading blanks, which
 * spreadsheets skip; numbers of our own are never texts.
 */
function text(value: string): string {
  const safe = /^\s*[=+\-@\t\r]/.test(value) ? `'${value}` : value
  return /[",\r\n]/.test(safe) || safe !== value ? `"${safe.replaceAll('"', '""')}"` : safe
}
