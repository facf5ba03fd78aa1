import { readFile } from 'node:fs/promises'
import { expect, test } from 'vitest'
import { resolverTypes } from '../../schema/generate-resolver-types.ts'

test('resolver types are those of the schema', async () => {
  const stored = await readFile(new URL('../../src/graphql/resolver-types.ts', import.meta.url), 'utf8')
  expect(stored).toBe(await resolverTypes())
})
