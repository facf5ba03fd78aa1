import type { FastifyInstance } from 'fastify'
import type { Browser } from 'playwright-core'
import { extractText } from 'unpdf'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { demoBody } from '../print/records.ts'
import { available, launch, open, seriousFindings } from './browser.ts'

/** A project of two revisions, looked at as an engineer does: plan, both revisions, one check, the sheet of a cap, the piles. */
let app: FastifyInstance
let address: string
let browser: Browser
const plan = '/v1/projects/quay/plan'
const ids: string[] = []

/** The next week's model: one column heavier, one lighter, one cap gone, one new. */
function nextWeek() {
  const body = demoBody()
  for (const row of body.loads.rows) {
    if (row.cap === 'A2') row.Fz *= 1.6
    if (row.cap === 'C2') row.Fz *= 0.6
  }
  body.caps = body.caps.filter((cap: { mark: string }) => cap.mark !== 'B3')
  body.loads.rows = body.loads.rows.filter((row: { cap: string }) => row.cap !== 'B3')
  const model = body.caps.find((cap: { mark: string }) => cap.mark === 'A1')
  body.caps.push({ ...model, mark: 'D1', x: model.x - 12 })
  for (const row of body.loads.rows.filter((r: { cap: string }) => r.cap === 'A1'))
    body.loads.rows.push({ ...row, cap: 'D1' })
  return body
}

async function send(method: 'PUT' | 'POST', path: string, body: unknown): Promise<Record<string, string>> {
  const headers = { 'content-type': 'application/json' }
  const reply = await fetch(address + path, { method, headers, body: JSON.stringify(body) })
  expect(reply.status).toBe(201)
  return (await reply.json()) as Record<string, string>
}

beforeAll(async () => {
  if (!available) return
  app = await buildApp(readConfig({ LOG_LEVEL: 'silent', WORKERS: '1' }))
  address = await app.listen({ port: 0, host: '127.0.0.1' })
  await send('PUT', '/v1/projects/quay', { title: 'River quay warehouse' })
  for (const body of [demoBody(), nextWeek()]) ids.push((await send('POST', '/v1/projects/quay/assessments', body)).id!)
  browser = await launch()
})
afterAll(async () => {
  await browser?.close()
  await app?.close()
})

describe.skipIf(!available)('pages of records in the browser', () => {
  const pages: Readonly<Record<string, () => string>> = {
    plan: () => plan,
    'plan beside an earlier revision': () => `${plan}?since=1`,
    'plan of one check': () => `${plan}?check=settlement`,
    'plan of an earlier revision': () => `/v1/assessments/${ids[0]}/sheet`,
    'sheet of a cap': () => `/v1/assessments/${ids[1]}/caps/A2/sheet`,
    'schedule of piles': () => `/v1/assessments/${ids[1]}/piles`,
  }
  test.each(Object.keys(pages))(
    '%s: no fault, no request elsewhere, nothing serious for axe, whole at 360 px',
    async (name) => {
      const { page, faults } = await open(browser, address, { path: pages[name]!() })
      await page.locator('h1').waitFor()
      expect(await page.locator('.issue').textContent()).toContain('River quay warehouse')
      expect(await seriousFindings(page)).toEqual([])
      expect(faults).toEqual([])
      await page.setViewportSize({ width: 360, height: 800 })
      expect(await page.evaluate('document.documentElement.scrollWidth')).toBeLessThanOrEqual(360)
      await page.context().close()
    },
  )

  test('from the plan to both revisions, to one check, and back, by keyboard', async () => {
    const { page, faults } = await open(browser, address, { path: plan })
    const follow = async (name: string) => {
      await page.getByRole('link', { name, exact: true }).focus()
      const left = page.url()
      await page.keyboard.press('Enter')
      await page.waitForURL((url) => url.href !== left)
    }
    await follow('Beside the revision before')
    expect(await page.locator('svg.map').count()).toBe(2)
    expect(await page.locator('.sheetlet h3').allTextContents()).toEqual(['Revision 1', 'Revision 2'])
    const changed = await page.locator('#changes tbody tr').allTextContents()
    expect(changed.some((row) => /^A2.*rises/.test(row))).toBe(true)
    expect(changed.some((row) => /^C2.*falls/.test(row))).toBe(true)
    expect(await page.locator('#changes').textContent()).toMatch(/Caps added: D1\..*Caps gone: B3\./s)
    await follow('settlement')
    expect(new URL(page.url()).search).toBe(`?check=settlement&since=${ids[0]}`)
    expect(await page.locator('.filters [aria-current]').textContent()).toBe('settlement')
    const governs = await page.locator('#caps tbody tr td:nth-child(6)').allTextContents()
    expect(new Set(governs)).toEqual(new Set(['settlement']))
    await follow('This revision alone')
    expect(await page.locator('svg.map').count()).toBe(1)
    await follow('the largest of all')
    expect(page.url()).toBe(address + plan)
    expect(faults).toEqual([])
    await page.context().close()
  })

  test('a cap of the plan leads to its sheet, and from there to all caps of that revision', async () => {
    const { page, faults } = await open(browser, address, { path: plan })
    await page.locator('#caps').getByRole('link', { name: 'A2', exact: true }).click()
    await page.waitForURL(`**/v1/assessments/${ids[1]}/caps/A2/sheet`)
    expect(await page.locator('h1').textContent()).toBe('Cap A2')
    expect(await page.locator('.issue').textContent()).toContain('not signed')
    await page.getByRole('link', { name: 'All caps' }).click()
    await page.waitForURL(`**/v1/assessments/${ids[1]}/sheet`)
    await page.getByRole('link', { name: 'Schedule of piles' }).click()
    const download = page.waitForEvent('download')
    await page.getByRole('link', { name: 'The same as CSV' }).click()
    expect((await download).suggestedFilename()).toBe('quay-2-piles.csv')
    expect(faults).toEqual([])
    await page.context().close()
  })

  test('both revisions on paper: every sheet with its strip, nothing wider than the paper', async () => {
    const { page } = await open(browser, address, { path: `${plan}?since=1` })
    const pdf = await page.pdf({ format: 'A4' })
    const { text, totalPages } = await extractText(new Uint8Array(pdf), { mergePages: false })
    expect(totalPages).toBeLessThan(7)
    for (const [i, sheet] of text.entries()) {
      expect(sheet.replace(/\s/g, '')).toContain(`page${i + 1}of${totalPages}`)
      expect(sheet).toContain('revision 2')
    }
    await page.context().close()
  })
})
