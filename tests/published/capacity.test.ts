import { readFileSync } from 'node:fs'
import { expect, test } from 'vitest'
import { calculateBlock, calculateGroup, calculateSinglePile } from '../../src/engine/index.ts'
import type { GroupRequest } from '../../src/engine/requests.ts'

type Case = {
  id: string
  request: GroupRequest
  expected: Record<'single' | 'block' | 'group', Record<string, number | string>>
}
const { cases, tolerance } = JSON.parse(readFileSync(new URL('capacity.json', import.meta.url), 'utf8')) as {
  cases: Case[]
  tolerance: number
}

/** Every expected figure of a case, against the same field of the answer. */
function compare(got: object, expected: Record<string, number | string>): void {
  for (const [field, value] of Object.entries(expected)) {
    const mine = (got as Record<string, number | string>)[field]
    if (typeof value === 'string') expect(mine, field).toBe(value)
    else
      expect(
        Math.abs((mine as number) - value) / Math.max(1, Math.abs(value)),
        `${field}: ${mine} against ${value}`,
      ).toBeLessThan(tolerance)
  }
}

test('no case is dropped', () => expect(cases).toHaveLength(20))

test.each(cases.map((c) => [c.id, c] as const))('%s', (_, { request, expected }) => {
  const { layout, ...single } = request
  compare(calculateSinglePile(single, { trace: false }).result, expected.single)
  compare(calculateBlock({ ...single, layout }, { trace: false }).result, expected.block)
  compare(calculateGroup({ ...single, layout }, { trace: false }).result, expected.group)
})
