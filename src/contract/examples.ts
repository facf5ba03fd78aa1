import { readFileSync } from 'node:fs'

const names = ['single-pile', 'block', 'group', 'settlement', 'assessment'] as const

/** The example requests that the document shows and the tests send: `schema/examples/<route>.json`. */
export const readExamples = (): Readonly<Record<string, unknown>> =>
  Object.fromEntries(
    names.map((name) => [
      name,
      JSON.parse(readFileSync(new URL(`../../schema/examples/${name}.json`, import.meta.url), 'utf8')) as unknown,
    ]),
  )
