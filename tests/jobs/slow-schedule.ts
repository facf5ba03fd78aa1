import { readExamples } from '../../src/contract/examples.ts'

type Part = Record<string, unknown>
type Schedule = Part & { caps: Part[]; loads: Part & { rows: (Part & { cap: string })[] } }

/** The example with `caps` caps, each in a layout of its own, so that none is computed for another, in thin sublayers. */
export function slowSchedule(caps: number): Schedule {
  const example = readExamples().assessment as Schedule
  const [first] = example.caps
  const rows = example.loads.rows.filter((row) => row.cap === first!.mark)
  const marks = Array.from({ length: caps }, (_, i) => `S${i}`)
  return {
    ...example,
    methods: { ...(example.methods as object), sublayer: 0.05 },
    title: `${caps} slow caps`,
    caps: marks.map((mark, i) => ({
      ...first,
      mark,
      x: 30 * (i % 20),
      y: 30 * Math.floor(i / 20),
      layout: { kind: 'grid', columns: 4, rows: 3, spacing: 3 + i / 1000 },
    })),
    loads: { ...example.loads, rows: marks.flatMap((cap) => rows.map((row) => ({ ...row, cap }))) },
  }
}
