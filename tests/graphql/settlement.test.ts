import { readFileSync } from 'node:fs'
import { expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'

const { cases } = JSON.parse(
  readFileSync(new URL('../published/homogeneous-settlement.json', import.meta.url), 'utf8'),
) as {
  cases: { request: Record<string, unknown> }[]
}

test('settlement over GraphQL and over REST are the same', async () => {
  const app = await buildApp(readConfig({ LOG_LEVEL: 'silent' }))
  for (const { request } of cases) {
    const { method: _, ...asked } = request
    const query = `query ($r: SettlementRequestInput!) { settlement(request: $r) {
      meta { requestHash } result { single { load settlement stiffness influenceFactor baseLoadShare axial { depth axialLoad shaftStress } } group { settlement tilt { alongX alongY } stiffness { atOrigin { flexibility stiffness } } piles { x y load settlement } } } } }`
    const graphql = (
      await app.inject({ method: 'POST', url: '/graphql', payload: { query, variables: { r: asked } } })
    ).json()
    const rest = (await app.inject({ method: 'POST', url: '/v1/settlement?trace=none', payload: asked })).json()
    const { single, group, requestHash } = { ...graphql.data.settlement.result, ...graphql.data.settlement.meta }
    expect(requestHash).toBe(rest.meta.requestHash)
    expect(single).toEqual(rest.result.single)
    expect(group?.piles).toEqual(rest.result.group?.piles)
    expect(group?.tilt).toEqual(rest.result.group?.tilt)
    expect(group?.stiffness).toEqual(rest.result.group && { atOrigin: rest.result.group.stiffness.atOrigin })
  }
  await app.close()
})
