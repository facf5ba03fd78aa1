import type { UnitCode } from '../engine/quantities/units.ts'
import type { Trace } from '../engine/trace/step.ts'
import type { Lines } from './lines.ts'
import { html, joined, type Markup } from './markup.ts'
import { shortQuantity } from './quantity.ts'
import { reference } from './references.ts'

/** The line in which a number of the result was found. */
export function lineOfResult(trace: Trace, lines: Lines, pointer: string): Markup | undefined {
  const id = trace.results[pointer]
  const line = id === undefined ? undefined : lines.of(id)
  return line && reference(line.number)
}

export type Outcome = {
  readonly name: string
  readonly pointer: string
  readonly value: number | undefined
  readonly unit: UnitCode
}

/** Numbers of the result with the lines that they were found in. */
export function outcomeTable(trace: Trace, lines: Lines, outcomes: readonly Outcome[]): Markup {
  const rows = outcomes.flatMap(({ name, pointer, value, unit }) =>
    value === undefined
      ? []
      : [
          html`<tr><th scope="row">${name}</th><td class="num">${shortQuantity(value, unit)}${lineOfResult(trace, lines, pointer)}</td></tr>
`,
        ],
  )
  return html`<table class="outcome"><tbody>${joined(rows)}</tbody></table>`
}

/** The answer in large type. */
export const answerLine = (words: string, value: number, unit: UnitCode): Markup =>
  html`<p class="answer"><span>${words}</span> <strong>${shortQuantity(value, unit)}</strong></p>`
