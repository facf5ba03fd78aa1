import { expect, test } from 'vitest'
import { negotiate } from '../../src/graphql/media-type.ts'

const json = 'application/json'
const graphql = 'application/graphql-response+json'
test.each([
  [undefined, json],
  ['', json],
  ['*/*', json],
  ['application/*', json],
  [graphql, graphql],
  [`${json}, ${graphql}`, graphql],
  [`${graphql};q=0.5, ${json}`, json],
  [`${graphql}; charset=utf-8, */*;q=0.1`, graphql],
  [`${json};q=0, */*`, graphql],
  [`${graphql};q=0, */*`, json],
  ['APPLICATION/JSON', json],
  ['text/html', undefined],
  [`${json};q=0`, undefined],
])('accept %s gives %s', (accept, type) => {
  expect(negotiate(accept)).toBe(type)
})
