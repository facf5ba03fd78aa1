import { type MathNode, parse } from 'mathjs'
import temml from 'temml'
import type { UnitCode } from '../quantities/units.ts'
import type { Declaration } from './formula.ts'
import type { OperandLine, Step } from './step.ts'
import { texNumber, texQuantity, texSymbol, texUnit } from './tex.ts'

/** The typeset lines of a formula and of a step, as MathML strings. Nothing is evaluated: the printed numbers are set, rounded for reading. */

// biome-ignore lint/suspicious/noExplicitAny: mathjs node types are a union discriminated at run time by `type`
type Node = MathNode & Record<string, any>
type Symbols = (name: string, node: MathNode) => string

const render = (tex: string): string => temml.renderToString(tex, { throwOnError: true, displayMode: true })

/** The tree without its brackets: the precedence of the operators gives back those that are needed. */
const parsed = (text: string): MathNode =>
  parse(text).transform((node) => {
    let inner = node as Node
    while (inner.type === 'ParenthesisNode') inner = inner.content
    return inner
  })

/**
 * The TeX of a formula's text; a number beside a unit is a quantity. The space before an atom keeps a letter off the
 * command before it (mathjs writes `\cdot` without one), and `1, 0.5` from being read as one number with a decimal comma.
 */
function texFormula(root: MathNode, symbols: Symbols): string {
  const handler = (node: Node): string | undefined => {
    if (node.type === 'ConstantNode' && typeof node.value === 'number') return ` ${texNumber(node.value)}`
    if (node.type === 'SymbolNode') return ` ${symbols(node.name, node)}`
    if (node.type === 'OperatorNode' && node.implicit) {
      const [amount, unit] = node.args as Node[]
      if (amount?.type === 'ConstantNode' && unit?.type === 'SymbolNode')
        return texQuantity(texNumber(amount.value), texUnit(unit.name))
    }
    return undefined
  }
  return root.toTex({ handler, parenthesis: 'auto' })
}

/** The symbolic line of a declared formula: `symbol = text`. Throws when the text is no formula. */
export function formulaMathml({
  symbol,
  text,
}: Pick<Declaration<Record<string, UnitCode>, UnitCode>, 'symbol' | 'text'>): string {
  return render(`${texSymbol(symbol)} = ${texFormula(parsed(text), texSymbol)}`)
}

const SIGNIFICANT = 5
const rounded = (value: number) => texNumber(Number(value.toPrecision(SIGNIFICANT)))
const quantity = ({ value, unit }: { value: number; unit: UnitCode }) => texQuantity(rounded(value), texUnit(unit))
const bracketed = (tex: string) => `\\left(${tex}\\right)`
const list = (operands: readonly OperandLine[]) => operands.map(quantity).join(',\\; ')

type Writing = { readonly tex: string; readonly power: boolean }
const asRounded = (operand: OperandLine): Writing => {
  const tex = quantity(operand)
  return { tex, power: tex.includes('^') }
}

/** A number put in place of a symbol needs brackets where its sign, unit or power of ten would read wrongly. */
function numbers(root: MathNode, operands: readonly OperandLine[], write: (o: OperandLine) => Writing): Symbols {
  const values = new Map(operands.map((o) => [o.symbol, o]))
  const bare = new Set<MathNode>()
  const powered = new Set<MathNode>()
  root.traverse((node, path, parent) => {
    if (node.type !== 'SymbolNode') return
    const op = parent?.type === 'OperatorNode' ? (parent as Node).op : undefined
    if (op === undefined || op === '/' || parent === null) bare.add(node)
    if (op === '^' && path === 'args[0]') powered.add(node)
  })
  return (name, node) => {
    const operand = values.get(name)
    if (!operand) return texSymbol(name)
    const { tex, power } = write(operand)
    const compound = powered.has(node) && (operand.unit !== '1' || power)
    return compound || (operand.value < 0 && !bare.has(node)) ? bracketed(tex) : tex
  }
}

function texOperands(step: Step): string | undefined {
  switch (step.kind) {
    case 'formula': {
      const root = parsed(step.formula)
      return texFormula(root, numbers(root, step.operands, asRounded)).trim()
    }
    case 'sum':
      return step.operands.map((o, i) => (o.value < 0 && i > 0 ? bracketed(quantity(o)) : quantity(o))).join(' + ')
    case 'choice':
      return `\\${step.rule === 'smallest' ? 'min' : 'max'}${bracketed(list(step.operands))}`
    case 'lookup': {
      const [low, high] = step.rows
      const x = step.operands[0]
      if (!low || !high || !x) return undefined
      const [x0, y0, x1, y1] = [...low, ...high].map((n) => rounded(n))
      const difference = (a: string, b: string) => `${a} - ${b.startsWith('-') ? bracketed(b) : b}`
      const slope = `\\frac{${difference(y1!, y0!)}}{${difference(x1!, x0!)}}`
      return `${y0} + ${slope} \\cdot ${bracketed(difference(rounded(x.value), x0!))}`
    }
    default:
      return undefined
  }
}

/** The line of a step with its numbers: `symbol = operands put in = value`. Inputs, solutions and rows read straight off have no middle part. */
export function stepMathml(step: Step): string {
  const middle = texOperands(step)
  const parts = [texSymbol(step.symbol), ...(middle === undefined ? [] : [middle]), quantity(step)]
  // A formula without arithmetic (`c_u`, `4 m`) would print its value twice.
  return render(parts.filter((part, i) => i === 0 || part !== parts[i - 1]).join(' = '))
}

const slotted = new Map<string, readonly string[]>()
/** Formulas come from declarations, signs and powers are few: the bound only stands against traces that were made up. */
const MOST_SLOTTED = 2000

/**
 * The right side of a formula with places for its numbers: pieces of MathML, in turn a text and the index of the operand that
 * stands after it. `powers` says which numbers will be written with a power of ten. Typesetting costs half a millisecond, so
 * the pieces are kept: all steps of one declaration with the same signs share them.
 */
export function slottedMathml(
  formula: string,
  operands: readonly OperandLine[],
  powers: readonly boolean[],
): readonly string[] {
  const shape = operands.map((o, i) => `${o.symbol} ${o.unit} ${o.value < 0} ${powers[i]}`)
  const key = [formula, ...shape].join('|')
  const known = slotted.get(key)
  if (known) return known
  const index = new Map(operands.map((o, i) => [o.symbol, i]))
  const root = parsed(formula)
  const write = (o: OperandLine) => ({ tex: `\\text{@${index.get(o.symbol)}@}`, power: powers[index.get(o.symbol)!]! })
  const pieces = render(texFormula(root, numbers(root, operands, write))).split(/<mtext[^>]*>@(\d+)@<\/mtext>/)
  if (slotted.size < MOST_SLOTTED) slotted.set(key, pieces)
  return pieces
}
