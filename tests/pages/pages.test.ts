import { existsSync } from 'node:fs'
import type { FastifyInstance } from 'fastify'
import { type Browser, chromium } from 'playwright-core'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'

/** Debian's browser. A machine without it (CI installs nothing) says so and leaves these tests out. */
const executablePath = process.env.CHROMIUM ?? '/usr/bin/chromium'
const available = existsSync(executablePath)
if (!available) console.warn(`no browser at ${executablePath}: the pages are not looked at`)
const quiet = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
]

let app: FastifyInstance
let address: string
let browser: Browser
beforeAll(async () => {
  if (!available) return
  app = await buildApp(readConfig({ LOG_LEVEL: 'silent' }))
  address = await app.listen({ port: 0, host: '127.0.0.1' })
  browser = await chromium.launch({ executablePath, args: quiet })
})
afterAll(async () => {
  await browser?.close()
  await app?.close()
})

async function open(path: string) {
  const page = await browser.newPage()
  const faults: string[] = []
  page.on('console', (m) => m.type() === 'error' && faults.push(m.text()))
  page.on('pageerror', (e) => faults.push(e.message))
  page.on(
    'request',
    (r) => !r.url().startsWith(address) && !r.url().startsWith('data:') && faults.push(`foreign: ${r.url()}`),
  )
  await page.goto(address + path)
  return { page, faults }
}

test.skipIf(!available)('the reference page shows every route and asks nobody else', async () => {
  const { page, faults } = await open('/reference/')
  await page.getByText('/v1/assessments').first().waitFor()
  const { paths } = (await (await fetch(`${address}/openapi.json`)).json()) as { paths: Record<string, object> }
  const operations = Object.values(paths).flatMap((path) => Object.keys(path))
  expect(await page.locator('.opblock').count()).toBe(operations.length)
  expect(await page.title()).toBe('Kentledge, API reference')
  expect(faults).toEqual([])
})

test.skipIf(!available)('the explorer runs its first query', async () => {
  const { page, faults } = await open('/graphql/explorer')
  await page.getByRole('button', { name: 'Run' }).click()
  await page.getByText('"ultimateResistance"').waitFor()
  expect(faults).toEqual([])
})
