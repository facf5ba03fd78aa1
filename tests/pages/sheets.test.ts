import type { FastifyInstance } from 'fastify'
import type { Browser } from 'playwright-core'
import { extractText } from 'unpdf'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { demoBody, exampleBody } from '../print/records.ts'
import { type Ask, available, launch, open, seriousFindings } from './browser.ts'

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

const hostile = '</style><script>alert(1)</script><img src=x onerror=alert(2)>"\''

/** The demo under names that would be markup in a careless page. */
function hostileBody() {
  const body = demoBody()
  body.title = hostile
  body.ground.BH2.layers[0].name = hostile
  body.caps[9].mark = hostile
  for (const row of body.loads.rows) if (row.cap === 'C2') row.cap = hostile
  return body
}

const pages: Readonly<Record<string, Ask>> = {
  'one pile': { path: '/v1/single-pile', body: exampleBody('single-pile') },
  block: { path: '/v1/block', body: exampleBody('block') },
  group: { path: '/v1/group', body: exampleBody('group') },
  settlement: { path: '/v1/settlement', body: exampleBody('settlement') },
  'settlement of softening piles': {
    path: '/v1/settlement',
    body: { ...exampleBody('settlement'), method: 'elastic-continuum', nonlinearity: 'hyperbolic' },
  },
  'one cap': { path: '/v1/assessments?cap=C2', body: demoBody() },
  plan: { path: '/v1/assessments', body: demoBody() },
  'plan with hostile names': { path: '/v1/assessments', body: hostileBody() },
  'cap with a hostile name': { path: `/v1/assessments?cap=${encodeURIComponent(hostile)}`, body: hostileBody() },
}

describe.skipIf(!available)('pages in the browser', () => {
  test.each(Object.keys(pages))('%s: no fault, no request elsewhere, nothing serious for axe', async (name) => {
    const { page, faults } = await open(browser, address, pages[name]!)
    await page.locator('h1').waitFor()
    expect(await page.locator('.drawing').count()).toBeGreaterThan(0)
    expect(await page.locator('script:not([src])').count()).toBe(0)
    expect(await page.locator('[style]').count()).toBe(0)
    expect(await seriousFindings(page)).toEqual([])
    expect(faults).toEqual([])
    await page.context().close()
  })

  test.each(['one cap', 'plan', 'settlement'])(
    '%s at 360 px: nothing is cut off, only figures and tables scroll',
    async (name) => {
      const { page } = await open(browser, address, { ...pages[name]!, width: 360 })
      const wide = await page.evaluate('document.documentElement.scrollWidth')
      expect(wide).toBeLessThanOrEqual(360)
      const small = await page.evaluate(
        `[...document.querySelectorAll('main p, main td, main li')].filter((e) => Number.parseFloat(getComputedStyle(e).fontSize) < 11).length`,
      )
      expect(small).toBe(0)
      await page.context().close()
    },
  )

  test('links between lines work by keyboard', async () => {
    const { page } = await open(browser, address, pages.group!)
    const first = page.locator('#lines a.ref').first()
    const href = await first.getAttribute('href')
    await first.focus()
    await page.keyboard.press('Enter')
    expect(new URL(page.url()).hash).toBe(href)
    expect(await page.locator(`${href}:target`).count()).toBe(1)
    // From there the next stop is a line that uses this one.
    await page.keyboard.press('Tab')
    const [kind, next] = await page.evaluate<[string, string]>(
      '[document.activeElement.className, document.activeElement.getAttribute("href")]',
    )
    expect(kind).toMatch(/use|cite/)
    await page.keyboard.press('Enter')
    expect(new URL(page.url()).hash).toBe(next)
    await page.context().close()
  })

  test('the plan is readable without scripts, and sorts with them', async () => {
    const marks = (page: Awaited<ReturnType<typeof open>>['page']) => page.locator('#caps tbody th').allTextContents()
    const plain = await open(browser, address, { ...pages.plan!, scripts: false })
    const byUtilisation = await marks(plain.page)
    expect(byUtilisation.slice(0, 2)).toEqual(['C2', 'B1'])
    expect(await plain.page.locator('thead button').count()).toBe(0)
    await plain.page.context().close()
    const { page, faults } = await open(browser, address, pages.plan!)
    expect(await marks(page)).toEqual(byUtilisation)
    await page.getByRole('button', { name: 'cap', exact: true }).focus()
    await page.keyboard.press('Enter')
    expect(await marks(page)).toEqual([...byUtilisation].sort())
    expect(await page.locator('th[aria-sort="ascending"]').count()).toBe(1)
    await page.getByRole('button', { name: 'utilisation', exact: true }).click()
    await page.getByRole('button', { name: 'utilisation', exact: true }).click()
    expect(await marks(page)).toEqual(byUtilisation)
    await page.locator('g[data-cap="9"]').hover()
    expect(await page.locator('tr.pointed th').allTextContents()).toEqual(['C2'])
    expect(faults).toEqual([])
    await page.context().close()
  })

  test.each(['A4', 'Letter'])(
    'on %s every sheet has its strip and its number, and no line is broken',
    async (format) => {
      const { page } = await open(browser, address, pages['one cap']!)
      const lines = await page.evaluate<{ name: string; foot: string }[]>(
        `[...document.querySelectorAll('section.line:not(.several)')].map((e) => ({
        name: e.querySelector('.name').textContent,
        foot: e.querySelector('.foot .to, .foot .end').textContent,
      }))`,
      )
      const pdf = await page.pdf({ format })
      const { text, totalPages } = await extractText(new Uint8Array(pdf), { mergePages: false })
      expect(totalPages).toBeGreaterThan(8)
      expect(totalPages).toBeLessThan(30)
      const bare = (t: string) => t.replace(/\s/g, '')
      const sheets = text.map(bare)
      for (const [i, sheet] of sheets.entries()) {
        expect(sheet).toContain(`page${i + 1}of${totalPages}`)
        expect(sheet).toContain('CapC2')
        expect(sheet).toContain('sha256:')
      }
      const once = lines.filter((l) => lines.filter((o) => o.name === l.name).length === 1)
      // Enough of them to stand for the sheet.
      expect(once.length).toBeGreaterThan(20)
      const broken = once.filter((l) => !sheets.some((s) => s.includes(bare(l.name)) && s.includes(bare(l.foot))))
      expect(broken).toEqual([])
      await page.context().close()
    },
  )
})
