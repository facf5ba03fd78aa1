import type { OperandLine, RangeLine, Step } from '../engine/trace/step.ts'
import { formulaLine, numbersLine } from './formula-line.ts'
import { from, head, SHORT } from './line-head.ts'
import type { Group, Line, Lines } from './lines.ts'
import { html, joined, type Markup } from './markup.ts'
import { number, quantity, unitLabel } from './quantity.ts'
import { lineNumber, usedIn } from './references.ts'
import { lineLabels } from './sections.ts'
import { solution, solutionTable } from './solution-block.ts'
import { symbol } from './symbol.ts'

type OfKind<K extends Step['kind']> = Extract<Step, { kind: K }>

/** How one bundle of lines is printed: what it is called, the formula, the numbers put in, the result, the source. */
export function lineBlock(group: Group, lines: Lines, layerNames: readonly string[]): Markup {
  const [first] = group.lines
  const { step } = first!
  if (group.lines.length > 1)
    return step.kind === 'solution' ? solutionTable(group, lines, layerNames) : table(group, lines, layerNames)
  return html`<section class="line" id="s${first!.number}" data-step="${step.id}">
${head(step, first)}${body(step, lines)}
<p class="foot">${foot(step, lines)}${after(first!, lines)}</p>
</section>
`
}

function body(step: Step, lines: Lines): Markup {
  switch (step.kind) {
    case 'formula':
      return html`<div class="set">${formulaLine(step)}${numbersLine(step)}</div>`
    case 'sum':
      return sum(step, lines)
    case 'lookup':
      return lookup(step, lines)
    case 'choice':
      return choice(step, lines)
    case 'solution':
      return solution(step)
    case 'input':
      return html``
  }
}

function foot(step: Step, lines: Lines): Markup {
  if (step.kind !== 'formula' && step.kind !== 'solution') return html``
  const operands = step.operands.map((o, i) => html`${i > 0 && ', '}${symbol(o.symbol)}${from(o, lines)}`)
  return html`${operands.length > 0 && html`<span class="from">from ${joined(operands)}</span>`}${
    step.kind === 'formula' && step.range && ranges(step.range, step.operands)
  }`
}

function after(line: Line, lines: Lines): Markup {
  const users = lines.usedBy(line)
  return users.length === 0
    ? html`<span class="end">a result</span>`
    : html`<span class="to">used in ${usedIn(users)}</span>`
}

const ranges = (all: readonly RangeLine[], operands: readonly OperandLine[]): Markup =>
  joined(
    all.map((r) => {
      const unit = operands.find((o) => o.symbol === r.symbol)?.unit ?? '1'
      return html`<span class="range">${r.inside ? 'within' : html`<strong>outside</strong>`} the published range ${
        r.min !== undefined && html`${quantity(r.min, unit)} ≤ `
      }${symbol(r.symbol)}${r.max !== undefined && html` ≤ ${quantity(r.max, unit)}`}</span>`
    }),
  )

function sum(step: OfKind<'sum'>, lines: Lines): Markup {
  const parts = step.operands.map(
    (o, i) =>
      html`${i > 0 && ' + '}<span class="in">${o.value < 0 && i > 0 ? html`(${number(o.value)})` : number(o.value)}</span>${from(o, lines)}`,
  )
  const unit = unitLabel(step.unit)
  return html`<p class="sum">= ${step.operands.length > 1 && unit !== '' ? html`(${joined(parts)})\u202f${unit}` : html`${joined(parts)}${unit && `\u202f${unit}`}`} = <span class="out">${quantity(step.value, step.unit)}</span></p>`
}

function choice(step: OfKind<'choice'>, lines: Lines): Markup {
  const rows = step.operands.map(
    (o) =>
      html`<tr><td>${symbol(o.symbol)} <span class="name">${lines.of(o.from)?.step.name}</span></td><td class="num in">${quantity(o.value, o.unit)}${from(o, lines)}</td><td>${o.from === step.chosen ? html`<b>taken</b>` : html`<s>rejected</s>`}</td></tr>`,
  )
  return html`<p class="rule">the ${step.rule} of</p><table class="choice"><tbody>${joined(rows)}</tbody></table><p class="sum">= <span class="out">${quantity(step.value, step.unit)}</span></p>`
}

function lookup(step: OfKind<'lookup'>, lines: Lines): Markup {
  const [x] = step.operands
  const rows = step.rows.map(
    ([argument, value]) => html`<tr><td class="num">${number(argument)}</td><td class="num">${number(value)}</td></tr>`,
  )
  const unit = (u: string) => u && html` <span class="unit">[${u}]</span>`
  return html`<table class="rows"><thead><tr><th scope="col">${x && symbol(x.symbol)}${x && unit(unitLabel(x.unit))}</th><th scope="col">${symbol(step.symbol)}${unit(unitLabel(step.unit))}</th></tr></thead><tbody>${joined(rows)}</tbody></table><p class="sum">${
    step.rows.length > 1 ? 'straight between the rows' : 'read off the row'
  }${x && html` at ${symbol(x.symbol)} = <span class="in">${quantity(x.value, x.unit)}</span>${from(x, lines)}`}: <span class="out">${quantity(step.value, step.unit)}</span></p>`
}

/** Lines of one formula: typeset once, its numbers in columns. What is the same in every line stands above the columns. */
function table(group: Group, lines: Lines, layerNames: readonly string[]): Markup {
  const all = group.lines as readonly (Line & { readonly step: OfKind<'formula'> })[]
  const { step } = all[0]!
  const fixed = step.operands.map((o, i) => all.every((l) => lines.of(l.step.operands[i]!.from) === lines.of(o.from)))
  const labels = lineLabels(
    all.map((l) => l.ids),
    layerNames,
  )
  const constants = step.operands.filter((_, i) => fixed[i])
  const moving = step.operands.flatMap((o, i) => (fixed[i] ? [] : [{ o, i }]))
  const unit = (u: OperandLine['unit']) => unitLabel(u) && html` <span class="unit">[${unitLabel(u)}]</span>`
  const rows = all.map((line, k) => {
    const users = lines.usedBy(line)
    return html`<tr id="s${line.number}" data-step="${line.step.id}"><th scope="row">${lineNumber(line.number)}</th><td class="label">${labels[k]}</td>${moving.map(
      ({ i }) => {
        const operand = line.step.operands[i]!
        return html`<td class="num in">${number(operand.value)}${from(operand, lines)}</td>`
      },
    )}<td class="num out">${number(line.step.value)}</td><td class="uses">${usedIn(users)}</td></tr>
`
  })
  return html`<section class="line several${all.length <= SHORT && ' whole'}">
${head(step)}<div class="pair"><div class="rule"><div class="set">${formulaLine(step)}</div>${
    constants.length > 0 &&
    html`<p class="with">with ${constants.map((o, i) => html`${i > 0 && ', '}${symbol(o.symbol)} = <span class="in" data-symbol="${o.symbol}">${quantity(o.value, o.unit)}</span>${from(o, lines)}`)}</p>`
  }${
    step.range &&
    html`<p class="foot">${ranges(
      step.range.map((r, i) => ({ ...r, inside: all.every((l) => l.step.range?.[i]?.inside ?? true) })),
      step.operands,
    )}</p>`
  }</div>
<div class="wide" tabindex="0" role="region" aria-label="${step.name}, numbers"><table class="numbers"><thead><tr><th scope="col">line</th><th scope="col">for</th>${moving.map(({ o }) => html`<th scope="col" class="num" data-symbol="${o.symbol}">${symbol(o.symbol)}${unit(o.unit)}</th>`)}<th scope="col" class="num">${symbol(step.symbol)}${unit(step.unit)}</th><th scope="col">used in</th></tr></thead><tbody>
${joined(rows)}</tbody></table></div></div>
</section>
`
}
