import { expect, test } from 'vitest'
import { fieldUnits, unitOf } from '../../src/contract/field-units.ts'

test('a field of a schedule has one unit wherever it stands', () => {
  const units = fieldUnits()
  expect(units.size).toBeGreaterThan(30)
  expect([...units].filter(([, found]) => found.size > 1).map(([name, found]) => [name, ...found])).toEqual([])
})

test('values by pointer', () => {
  expect(unitOf('/loads/rows/3/Fz')).toBe('kN')
  expect(unitOf('/loads/rows/3/My')).toBe('kN.m')
  expect(unitOf('/ground/BH1/layers/0/undrainedShearStrength/top')).toBe('kPa')
  expect(unitOf('/limits/settlement')).toBe('mm')
  expect(unitOf('/caps/0/mark')).toBeUndefined()
})
