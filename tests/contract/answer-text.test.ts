import { expect, test } from 'vitest'
import { answerText } from '../../src/contract/answer-text.ts'
import { readExamples } from '../../src/contract/examples.ts'
import { assessSchedule } from '../../src/operations/assess-schedule.ts'
import { calculateGroup } from '../../src/operations/calculate-group.ts'

const { group, assessment } = readExamples()

test.each([true, false])('the text of an answer is what JSON.stringify gives, trace: %s', (trace) => {
  for (const answer of [calculateGroup(group, { trace }), assessSchedule(assessment, { trace })])
    expect(answerText(answer)).toBe(JSON.stringify(answer))
})

test('what has no value is left out; keys are escaped', () => {
  const odd = { 'a"b': 1, gone: undefined, trace: { '\n': [null], gone: undefined } }
  expect(answerText(odd)).toBe(JSON.stringify(odd))
  expect(answerText({ trace: undefined })).toBe('{}')
})
