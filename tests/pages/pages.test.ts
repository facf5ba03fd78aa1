import type { FastifyInstance } from 'fastify'
import type { Browser } from 'playwright-core'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { available, launch, open } from './browser.ts'

let app: FastifyInstance
let address: string
let browser: Browser
beforeAll(async () => {
  if (!available) return
  app = await buildApp(readConfig({ LOG_LEVEL: 'silent' }))
  address = await app.listen({ port: 0, host: '127.0.0.1' })
  browser = await launch()
})
afterAll(async () => {
  await browser?.close()
  await app?.close()
})

test.skipIf(!available)('the reference page shows every route and asks nobody else', async () => {
  const { page, faults } = await open(browser, address, { path: '/reference/' })
  await page.getByText('/v1/assessments').first().waitFor()
  const { paths } = (await (await fetch(`${address}/openapi.json`)).json()) as { paths: Record<string, object> }
  const operations = Object.values(paths).flatMap((path) => Object.keys(path))
  expect(await page.locator('.opblock').count()).toBe(operations.length)
  expect(await page.title()).toBe('Kentledge, API reference')
  expect(faults).toEqual([])
})

test.skipIf(!available)('the explorer runs its first query', async () => {
  const { page, faults } = await open(browser, address, { path: '/graphql/explorer' })
  await page.getByRole('button', { name: 'Run' }).click()
  await page.getByText('"ultimateResistance"').waitFor()
  expect(faults).toEqual([])
})
