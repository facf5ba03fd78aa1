import { parse as parseCsv } from 'csv-parse/sync'
import { expect, test } from 'vitest'
import { pileSchedule } from '../../src/print/pile-schedule.ts'
import { pileScheduleCsv } from '../../src/print/pile-schedule-csv.ts'
import { read } from './printed-page.ts'
import { demoBody, recordOf } from './records.ts'

test('the schedule of piles has every pile, in place, with the check that governs piles of its cap', () => {
  const record = recordOf()
  const rows = parseCsv(pileScheduleCsv(record), { columns: true }) as Record<string, string>[]
  expect(rows.length).toBe(record.reply.result.caps.reduce((sum, c) => sum + c.pileCount, 0))
  const third = rows.filter((r) => r.mark === 'C1')[2]!
  // Cap C1 stands at 0, 20; its third pile at 0, 1.2.
  expect([third['x [m]'], third['y [m]'], third['cut-off [m below surface]']]).toEqual(['0', '21.2', '1'])
  const check = record.reply.result.caps[8]!.checks[0]!
  expect(check.check).toBe('pile-compression')
  expect(Number(third['design load [kN]'])).toBe(check.demand)
  expect(Number(third['resistance [kN]'])).toBe(check.resistance)
  expect(Number(third.utilisation)).toBe(check.utilisation)
  const page = read(pileSchedule(record)).querySelectorAll('#piles tbody tr')
  expect(page.length).toBe(rows.length)
  expect(page.map((tr) => tr.querySelectorAll('.place').map((td) => Number(td.text.replace('−', '-'))))).toEqual(
    rows.map((r) => [Number(r['x [m]']), Number(r['y [m]'])]),
  )
})

test('a mark, type or combination that a spreadsheet would compute stays text', () => {
  const body = demoBody()
  const names: Record<string, string> = {
    A1: '=HYPERLINK("http://x")',
    A2: '+1',
    A3: '-2',
    A4: '@SUM(1)',
    B2: ' =1+1',
    B3: 'a"b,c',
  }
  const rename = (mark: string) => names[mark] ?? mark
  body.caps = body.caps.map((c: { mark: string }) => ({ ...c, mark: rename(c.mark) }))
  body.loads.rows = body.loads.rows.map((r: { cap: string }) => ({ ...r, cap: rename(r.cap) }))
  const csv = pileScheduleCsv(recordOf(body))
  const marks = new Set((parseCsv(csv, { columns: true }) as Record<string, string>[]).map((r) => r.mark))
  for (const name of Object.values(names)) expect(marks).toContain(/^\s*[=+\-@]/.test(name) ? `'${name}` : name)
  expect(csv).not.toMatch(/(^|,)"?\s*[=+@]/m)
})
