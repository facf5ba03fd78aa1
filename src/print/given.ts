import { alikeInput, type Line, type Lines, nameOfMany } from './lines.ts'
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

/** From so many on, inputs that only a number or a place tells apart stand in one entry. */
const MANY = 4

function list(title: string, given: readonly Line[], lines: Lines): Markup {
  const alike = Map.groupBy(given, (line) => alikeInput(line.step))
  const entries = [...alike.values()].flatMap((same) =>
    same.length < MANY ? same.map((line) => one(line, lines)) : [many(same, lines)],
  )
  return html`<h3>${title}</h3><ul class="given">${joined(entries)}</ul>`
}

function why({ step }: Line): Markup {
  if (step.kind !== 'input') return html``
  const place = step.from === undefined ? html`${step.reason}` : html`<code>${step.from}</code>`
  return html`${place}${step.source && html` <a class="cite" href="#source-${step.source.key}">${step.source.key}, ${step.source.locator}</a>`}`
}

const uses = (line: Line, lines: Lines): Markup | false => {
  const users = lines.usedBy(line)
  return users.length > 0 && html`<span class="to">→ ${usedIn(users)}</span>`
}

const one = (line: Line, lines: Lines): Markup =>
  html`<li id="s${line.number}" data-step="${line.step.id}">${lineNumber(line.number)}<span class="what">${symbol(line.step.symbol)} <span class="name">${inWords(line.step.name)}</span></span> <span class="out">${quantity(line.step.value, line.step.unit)}</span><span class="why">${why(line)}${uses(line, lines)}</span></li>
`

function many(same: readonly Line[], lines: Lines): Markup {
  const [first] = same
  const values = same.map(
    (
      line,
    ) => html`<span class="one" id="s${line.number}" data-step="${line.step.id}">${lineNumber(line.number)} <span class="out">${quantity(line.step.value, line.step.unit)}</span> ${uses(line, lines)}</span>
`,
  )
  return html`<li class="many"><span class="what">${symbol(first!.step.symbol)} <span class="name">${inWords(nameOfMany(first!.step.name))}, ${namedOf(same)}</span></span><span class="why">${why(first!)}</span><span class="values">${joined(values)}</span></li>
`
}

/** Which of many an entry holds, where their names count: piles 1 to 49. */
function namedOf(same: readonly Line[]): string {
  const number = (line: Line | undefined) => / (\d+)\b/.exec(line?.step.name ?? '')?.[1]
  const [from, to] = [number(same[0]), number(same.at(-1))]
  return from === undefined || to === undefined ? 'in turn' : `${from} to ${to}`
}

/** A parameter of a request in words: its name there is written in one. */
const inWords = (name: string): string =>
  name.replace(/^[a-z]+(?:[A-Z][a-z]+)+/, (field) => field.replace(/[A-Z]/g, (c) => ` ${c.toLowerCase()}`))
