import type { Line, Lines } from './lines.ts'
import { html, joined, type Markup } from './markup.ts'
import { quantity } from './quantity.ts'
import { lineNumber, usedIn } from './references.ts'
import { symbol } from './symbol.ts'

/** What the calculation starts from: numbers of the request with their place in it, then what was taken for want of one. */
export function givenTable(lines: Lines): Markup {
  const isTaken = ({ step }: Line) => step.kind === 'input' && step.from === undefined
  const asked = lines.given.filter((line) => !isTaken(line))
  const taken = lines.given.filter(isTaken)
  return html`${asked.length > 0 && list('Of the request', asked, lines)}${taken.length > 0 && list('Taken, with the reason', taken, lines)}`
}

function list(title: string, given: readonly Line[], lines: Lines): Markup {
  const rows = given.map((line) => {
    const { step } = line
    if (step.kind !== 'input') return html``
    const why = step.from === undefined ? step.reason : html`<code>${step.from}</code>`
    return html`<li id="s${line.number}" data-step="${step.id}">${lineNumber(line.number)}<span class="what">${symbol(step.symbol)} <span class="name">${inWords(step.name)}</span></span> <span class="out">${quantity(step.value, step.unit)}</span><span class="why">${why}${
      step.source &&
      html` <a class="cite" href="#source-${step.source.key}">${step.source.key}, ${step.source.locator}</a>`
    }<span class="to">→ ${usedIn(lines.usedBy(line))}</span></span></li>
`
  })
  return html`<h3>${title}</h3><ul class="given">${joined(rows)}</ul>`
}

/** A parameter of a request in words: its name there is written in one. */
const inWords = (name: string): string =>
  name.replace(/^[a-z]+(?:[A-Z][a-z]+)+/, (field) => field.replace(/[A-Z]/g, (c) => ` ${c.toLowerCase()}`))
