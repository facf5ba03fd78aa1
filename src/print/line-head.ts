import type { OperandLine, Step } from '../engine/trace/step.ts'
import { type Line, type Lines, nameOfMany } from './lines.ts'
import { html, type Markup } from './markup.ts'
import { lineNumber, reference } from './references.ts'
import { symbol } from './symbol.ts'

type Cited = { readonly source: { readonly key: string; readonly locator: string } }

/** Tables of so many lines are kept on one sheet of paper. */
export const SHORT = 14

/** Number, symbol and name of a line, with the place that it is published in. */
export function head(step: Step, line?: Line): Markup {
  return html`<h4>${line && lineNumber(line.number)} ${symbol(step.symbol)} <span class="name">${line ? step.name : nameOfMany(step.name)}</span>${
    'source' in step && step.source && cite({ source: step.source })
  }</h4>`
}

const cite = ({ source }: Cited): Markup =>
  html`<a class="cite" href="#source-${source.key}">${source.key}, ${source.locator}</a>`

/** The number of the line that an operand comes from. */
export function from(operand: OperandLine, lines: Lines): Markup | undefined {
  const line = lines.of(operand.from)
  return line && reference(line.number)
}
