import type { SolutionStep } from '../engine/trace/step.ts'
import { from, head, SHORT } from './line-head.ts'
import type { Group, Line, Lines } from './lines.ts'
import { html, joined, type Markup } from './markup.ts'
import { number, quantity, unitLabel } from './quantity.ts'
import { lineNumber, usedIn } from './references.ts'
import { lineLabels } from './sections.ts'
import { symbol } from './symbol.ts'

const unit = (u: SolutionStep['unit']) => unitLabel(u) && html` <span class="unit">[${unitLabel(u)}]</span>`

const unknownsOf = (step: SolutionStep): Markup =>
  joined(step.unknowns.map((u, i) => html`${i > 0 && ', '}${symbol(u.symbol)} = ${quantity(u.value, u.unit)}`))

/** A line that was solved for: method, unknowns, residuals with their bound, mesh, and the table that it was read from. */
export function solution(step: SolutionStep): Markup {
  const residuals = step.residuals.map((r) => html`<li>${r.name}: ${number(r.value)}</li>`)
  return html`<p class="sum">= <span class="out">${quantity(step.value, step.unit)}</span></p>
<p class="solved">Solved numerically: ${step.method}. Unknowns: ${unknownsOf(step)}.${mesh(step)} Residuals, each to stay below ${number(step.tolerance)}:</p>
<ul class="residuals">${joined(residuals)}</ul>${valueTable(step)}`
}

function mesh({ mesh: depths }: SolutionStep): Markup {
  if (!depths) return html``
  return html` Elements between the depths, in m: ${joined(depths.map((z, i) => html`${i > 0 && '; '}${number(z)}`))}.`
}

function valueTable({ table }: SolutionStep): Markup {
  if (!table) return html``
  const heads = table.columns.map((c) => html`<th scope="col" class="num">${symbol(c.symbol)}${unit(c.unit)}</th>`)
  const rows = table.rows.map((row) => html`<tr>${row.map((v) => html`<td class="num">${number(v)}</td>`)}</tr>`)
  return html`<table class="rows"><caption>Read from</caption><thead><tr>${heads}</tr></thead><tbody>${joined(rows)}</tbody></table>`
}

/** Lines that were solved for in one go: the method once, values and residuals in columns. */
export function solutionTable(group: Group, lines: Lines, layerNames: readonly string[]): Markup {
  const all = group.lines as readonly (Line & { readonly step: SolutionStep })[]
  const { step } = all[0]!
  const labels = lineLabels(
    all.map((l) => l.ids),
    layerNames,
  )
  // Where the unknown is the value itself it would stand twice.
  const own = all.every((l) => l.step.unknowns.length === 1 && l.step.unknowns[0]!.value === l.step.value)
  const shared = all.every((l) => JSON.stringify(l.step.unknowns) === JSON.stringify(step.unknowns))
  const operands = step.operands.map((o, i) => {
    const one = all.every((l) => lines.of(l.step.operands[i]!.from) === lines.of(o.from))
    return html`${i > 0 && ', '}${symbol(o.symbol)}${one ? from(o, lines) : ' of each line'}`
  })
  const each = !own && !shared
  const rows = all.map(
    (
      l,
      k,
    ) => html`<tr id="s${l.number}" data-step="${l.step.id}"><th scope="row">${lineNumber(l.number)}</th><td class="label">${labels[k]}</td>${each && html`<td>${unknownsOf(l.step)}</td>`}${l.step.residuals.map((r) => html`<td class="num">${number(r.value)}</td>`)}<td class="num">${symbol(l.step.symbol)}</td><td class="num out">${number(l.step.value)}</td><td class="uses">${usedIn(lines.usedBy(l))}</td></tr>
`,
  )
  return html`<section class="line several${all.length <= SHORT && ' whole'}">
${head(step)}<div class="pair"><div class="rule"><p class="solved">Solved numerically: ${step.method}.${shared && !own && html` Unknowns: ${unknownsOf(step)}.`} Residuals stay below ${number(step.tolerance)}.</p>${operands.length > 0 && html`<p class="foot"><span class="from">from ${joined(operands)}</span></p>`}</div>
<div class="wide" tabindex="0" role="region" aria-label="${step.name}, numbers"><table class="numbers"><thead><tr><th scope="col">line</th><th scope="col">for</th>${each && html`<th scope="col">unknowns</th>`}${step.residuals.map((r) => html`<th scope="col" class="num long">residual: ${r.name}</th>`)}<th scope="col"><span class="unseen">symbol</span></th><th scope="col" class="num">value${unit(step.unit)}</th><th scope="col">used in</th></tr></thead><tbody>
${joined(rows)}</tbody></table></div></div>
</section>
`
}
