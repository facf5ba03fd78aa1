import { html, joined, type Markup } from './markup.ts'

/** The number of a line where it is referred to: a link, and on paper a raised number. */
export const reference = (n: number): Markup => html`<a class="ref" href="#s${n}">(${n})</a>`

/** The number of a line where it stands. */
export const lineNumber = (n: number): Markup => html`<span class="no">(${n})</span>`

/** Where a line is used; runs of numbers as `12–18`. */
export function usedIn(numbers: readonly number[]): Markup {
  const runs: [number, number][] = []
  for (const n of numbers) {
    const last = runs.at(-1)
    if (last && last[1] === n - 1) last[1] = n
    else runs.push([n, n])
  }
  const shown = runs.map(([a, b], i) => html`${i > 0 && ', '}<a class="use" href="#s${a}">${a}${b > a && `–${b}`}</a>`)
  return joined(shown)
}
