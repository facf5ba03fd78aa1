import { csvText } from './csv-text.ts'
import { pileRows } from './pile-rows.ts'
import type { AssessmentRecord } from './record.ts'

const header =
  'mark,pile,type,x [m],y [m],cut-off [m below surface],toe level [m below surface],design load [kN],resistance [kN],utilisation,check,combination'

/** The schedule of piles as CSV (RFC 4180), every number in full. */
export function pileScheduleCsv(record: AssessmentRecord): string {
  const lines = pileRows(record).map((r) =>
    [
      csvText(r.cap),
      r.pile,
      csvText(r.type),
      r.x,
      r.y,
      r.cutOff,
      r.toe,
      r.check?.demand ?? '',
      r.check?.resistance ?? '',
      r.check?.utilisation ?? '',
      r.check?.check ?? '',
      csvText(r.check?.combination ?? ''),
    ].join(','),
  )
  return [header, ...lines, ''].join('\r\n')
}
