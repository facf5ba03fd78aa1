import { type MathNode, parse } from 'mathjs'
import { type Dimension, sameDimension, type Unit, type UnitCode, units } from '../quantities/units.ts'

/**
 * Compiles the text of a formula to a native function, and derives its dimension.
 * A whitelist of nodes and functions keeps the emitted code to arithmetic on the declared operands.
 * Operand values are scaled to the coherent set (m, kN, rad) on entry and the result back on exit.
 */

type Checked = { readonly code: string; readonly dimension: Dimension }
type Where = Readonly<Record<string, UnitCode>>

const FUNCTIONS: Readonly<Record<string, string>> = {
  min: 'Math.min',
  max: 'Math.max',
  sqrt: 'Math.sqrt',
  exp: 'Math.exp',
  log: 'Math.log',
  log10: 'Math.log10',
  sin: 'Math.sin',
  cos: 'Math.cos',
  tan: 'Math.tan',
  atan: 'Math.atan',
  tanh: 'Math.tanh',
  abs: 'Math.abs',
  ceil: 'Math.ceil',
}
const COMPARISONS = new Set(['<', '<=', '>', '>=', '=='])
const RATIO: Dimension = { length: 0, force: 0 }
const asUnit = (dimension: Dimension): Unit => ({ dimension, factor: 1 })
const equal = (a: Dimension, b: Dimension) => sameDimension(asUnit(a), asUnit(b))

class FormulaError extends Error {}
const fail = (text: string, why: string): never => {
  throw new FormulaError(`formula "${text}": ${why}`)
}

// biome-ignore lint/suspicious/noExplicitAny: mathjs node types are a union discriminated at run time by `type`
type Node = MathNode & Record<string, any>

function check(node: Node, where: Where, text: string, used: Set<string>): Checked {
  const walk = (n: MathNode): Checked => check(n as Node, where, text, used)
  switch (node.type) {
    case 'ParenthesisNode':
      return walk(node.content)
    case 'ConstantNode':
      if (typeof node.value !== 'number') fail(text, `only numbers may stand as constants, not ${node.value}`)
      return { code: String(node.value), dimension: RATIO }
    case 'SymbolNode': {
      if (node.name === 'pi') return { code: 'Math.PI', dimension: RATIO }
      const unit = where[node.name]
      if (!unit) return fail(text, `unknown symbol ${node.name}`)
      used.add(node.name)
      return { code: `$${node.name}`, dimension: units[unit].dimension }
    }
    case 'ConditionalNode': {
      const condition = walk(node.condition)
      const yes = walk(node.trueExpr)
      const no = walk(node.falseExpr)
      if (!equal(yes.dimension, no.dimension)) fail(text, 'the two branches differ in dimension')
      return { code: `(${condition.code} ? ${yes.code} : ${no.code})`, dimension: yes.dimension }
    }
    case 'FunctionNode': {
      const name: string = node.fn.name
      const js = Object.hasOwn(FUNCTIONS, name) ? FUNCTIONS[name] : undefined
      if (!js) return fail(text, `function ${name} is not allowed`)
      const args = (node.args as MathNode[]).map(walk)
      // mathjs would read further arguments (a base, a root) that the emitted code would drop.
      if (name !== 'min' && name !== 'max' && args.length > 1) fail(text, `${name} takes one argument`)
      const first = args[0] ?? fail(text, `${name} needs an argument`)
      const code = `${js}(${args.map((a) => a.code).join(', ')})`
      if (name === 'min' || name === 'max') {
        if (args.some((a) => !equal(a.dimension, first.dimension))) fail(text, `${name} compares different dimensions`)
        return { code, dimension: first.dimension }
      }
      if (name === 'abs') return { code, dimension: first.dimension }
      if (name === 'sqrt')
        return { code, dimension: { length: first.dimension.length / 2, force: first.dimension.force / 2 } }
      if (!equal(first.dimension, RATIO)) fail(text, `${name} needs a ratio`)
      return { code, dimension: RATIO }
    }
    case 'OperatorNode':
      return operator(node, where, text, used)
    default:
      return fail(text, `${node.type} is not allowed`)
  }
}

function operator(node: Node, where: Where, text: string, used: Set<string>): Checked {
  const args = node.args as Node[]
  const op: string = node.op
  if (node.implicit) {
    // "100 kPa": a quantity written in the formula. Any other implicit product would hide a slip.
    const [amount, name] = args
    const literal = amount?.type === 'ConstantNode' && name?.type === 'SymbolNode' && !(name.name in where)
    if (!literal || !(name.name in units)) return fail(text, 'write products with *')
    const unit = units[name.name as UnitCode]
    return { code: `${amount.value * unit.factor}`, dimension: unit.dimension }
  }
  const checked = args.map((a) => check(a, where, text, used))
  const [a, b] = checked
  if (!a) return fail(text, `operator ${op} without operand`)
  if (!b)
    return op === '-' ? { code: `(-${a.code})`, dimension: a.dimension } : fail(text, `operator ${op} is not allowed`)
  if (op === '+' || op === '-' || COMPARISONS.has(op)) {
    if (!equal(a.dimension, b.dimension)) fail(text, `${op} joins different dimensions`)
    return { code: `(${a.code} ${op} ${b.code})`, dimension: COMPARISONS.has(op) ? RATIO : a.dimension }
  }
  if (op === '*' || op === '/') {
    const sign = op === '*' ? 1 : -1
    const dimension = {
      length: a.dimension.length + sign * b.dimension.length,
      force: a.dimension.force + sign * b.dimension.force,
    }
    return { code: `(${a.code} ${op} ${b.code})`, dimension }
  }
  if (op === '^') {
    const code = `Math.pow(${a.code}, ${b.code})`
    if (equal(a.dimension, RATIO) && equal(b.dimension, RATIO)) return { code, dimension: RATIO }
    const exponent = Number(args[1]?.toString())
    if (!Number.isFinite(exponent)) fail(text, 'a quantity may only be raised to a constant power')
    return { code, dimension: { length: a.dimension.length * exponent, force: a.dimension.force * exponent } }
  }
  return fail(text, `operator ${op} is not allowed`)
}

export type Operands = Readonly<Record<string, { readonly value: number; readonly unit: UnitCode }>>
/** Refuses an operand whose unit is not the declared one. */
export type Misfit = (name: string, got: UnitCode) => never

/**
 * The native function of a formula: it checks the unit of each operand, then computes. Throws when the text names an unknown
 * symbol, leaves an operand unused, or does not have the declared dimension.
 */
export function compile(text: string, where: Where, unit: UnitCode, misfit: Misfit): (operands: Operands) => number {
  const used = new Set<string>()
  const { code, dimension } = check(parse(text) as Node, where, text, used)
  const names = Object.keys(where)
  const unused = names.filter((name) => !used.has(name))
  if (unused.length > 0) fail(text, `operand ${unused.join(', ')} is declared and not used`)
  if (!equal(dimension, units[unit].dimension)) {
    fail(text, `has dimension m^${dimension.length} kN^${dimension.force}, declared ${unit}`)
  }
  const scaled = (name: string) => {
    const factor = units[where[name]!].factor
    return factor === 1 ? `o.${name}.value` : `o.${name}.value * ${factor}`
  }
  const lines = names.map(
    (name) =>
      `if (o.${name}.unit !== ${JSON.stringify(where[name])}) misfit('${name}', o.${name}.unit); const $${name} = ${scaled(name)};`,
  )
  const out = units[unit].factor === 1 ? code : `(${code}) / ${units[unit].factor}`
  return new Function('misfit', `return (o) => { ${lines.join(' ')} return ${out}; }`)(misfit)
}
