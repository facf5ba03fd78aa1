import { existsSync, readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { type Browser, chromium, type Page } from 'playwright-core'

/** Debian's browser. A machine without it (CI installs nothing) says so and leaves these tests out. */
const executablePath = process.env.CHROMIUM ?? '/usr/bin/chromium'
export const available = existsSync(executablePath)
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
export const launch = (): Promise<Browser> => chromium.launch({ executablePath, args: quiet })

export type Opened = { readonly page: Page; readonly faults: string[] }
export type Ask = {
  readonly path: string
  readonly body?: unknown
  readonly width?: number
  readonly scripts?: boolean
}

/** Opens an address as a person does, by GET or by POST; gathers what goes wrong: console, page errors, requests elsewhere. */
export async function open(
  browser: Browser,
  address: string,
  { path, body, width = 1200, scripts = true }: Ask,
): Promise<Opened> {
  const context = await browser.newContext({ viewport: { width, height: 900 }, javaScriptEnabled: scripts })
  const page = await context.newPage()
  const faults: string[] = []
  page.on('console', (m) => (m.type() === 'error' || m.type() === 'warning') && faults.push(m.text()))
  page.on('pageerror', (e) => faults.push(e.message))
  page.on(
    'request',
    (r) => !r.url().startsWith(address) && !r.url().startsWith('data:') && faults.push(`foreign: ${r.url()}`),
  )
  if (body !== undefined) {
    await page.route(
      (url) => url.href === new URL(address + path).href,
      (route) =>
        route.request().isNavigationRequest()
          ? route.continue({
              method: 'POST',
              postData: JSON.stringify(body),
              headers: { ...route.request().headers(), 'content-type': 'application/json' },
            })
          : route.continue(),
    )
  }
  const reply = await page.goto(address + path)
  if (!reply?.ok()) throw new Error(`${path}: ${reply?.status()} ${await reply?.text()}`)
  return { page, faults }
}

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8')

/** What axe-core finds serious or critical on a page. */
export async function seriousFindings(page: Page): Promise<string[]> {
  await page.evaluate(axeSource)
  return page.evaluate(async () => {
    type Finding = { id: string; impact: string; nodes: { html: string }[] }
    const { violations } = await (
      globalThis as unknown as { axe: { run(): Promise<{ violations: Finding[] }> } }
    ).axe.run()
    return violations
      .filter((v) => v.impact === 'serious' || v.impact === 'critical')
      .map((v) => `${v.id}: ${v.nodes.length} × ${v.nodes[0]?.html.slice(0, 200)}`)
  })
}
