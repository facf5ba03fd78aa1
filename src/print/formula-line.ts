import { formulaMathml, slottedMathml } from '../engine/index.ts'
import type { FormulaStep } from '../engine/trace/step.ts'
import { html, type Markup, trusted } from './markup.ts'
import { hasPower, mathQuantity } from './quantity.ts'

/** The typesetter writes styles on its elements; the policy of the pages lets none through, and the style sheet has them. */
const unstyled = (mathml: string) => mathml.replace(/ style="[^"]*"/g, '').replace(/<mspace><\/mspace>/g, '')
const inner = (mathml: string) =>
  unstyled(mathml)
    .replace(/^<math[^>]*>/, '')
    .replace(/<\/math>$/, '')

const set = new Map<string, Markup>()

/** A formula as declared, typeset. Its text stands beside it for those who cannot see it. */
export function formulaLine(step: Pick<FormulaStep, 'symbol' | 'formula'>): Markup {
  const text = `${step.symbol} = ${step.formula}`
  const known = set.get(text)
  if (known) return known
  const typeset = trusted(inner(formulaMathml({ symbol: step.symbol, text: step.formula })))
  const line = html`<math display="block" class="formula" alttext="${text}">${typeset}</math>`
  if (set.size < 2000) set.set(text, line)
  return line
}

/** MathML is not broken into lines: a longer one is set smaller, so that it stands on a sheet of paper. */
const LONG = 90

/** The formula with its numbers put in, and the result. */
export function numbersLine(step: FormulaStep): Markup {
  const powers = step.operands.map((o) => hasPower(o.value))
  const pieces = slottedMathml(step.formula, step.operands, powers)
  const put = pieces.map((piece, i) => {
    if (i % 2 === 0) return unstyled(piece)
    const operand = step.operands[Number(piece)]!
    return html`<mrow class="in" data-symbol="${operand.symbol}">${trusted(mathQuantity(operand.value, operand.unit))}</mrow>`
      .text
  })
  const line = put
    .join('')
    .replace(/^<math[^>]*>/, '')
    .replace(/<\/math>$/, '')
  const result = `<mrow class="out">${mathQuantity(step.value, step.unit)}</mrow>`
  const long = line.replace(/<[^>]*>/g, '').length > LONG && ' long'
  return trusted(`<math display="block" class="numbers${long || ''}"><mo>=</mo>${line}<mo>=</mo>${result}</math>`)
}
