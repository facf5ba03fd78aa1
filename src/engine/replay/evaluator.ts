import { all, create, type MathNode, type Unit } from 'mathjs'

/** A math engine of its own, with units: it shares nothing with the compiler that the engine computes by. */
const math = create(all!)

/** UCUM codes as mathjs writes them. Angles are ratios, so rad drops out of compound units. */
const written: Readonly<Record<string, string>> = {
  m: 'm',
  m2: 'm^2',
  m3: 'm^3',
  m4: 'm^4',
  mm: 'mm',
  '1/m': 'm^-1',
  kN: 'kN',
  kPa: 'kPa',
  'kN/m': 'kN/m',
  'kN/m3': 'kN/m^3',
  'kN.m': 'kN m',
  'kN.m/rad': 'kN m',
  'rad/(kN.m)': 'kN^-1 m^-1',
  'm/kN': 'm/kN',
  '1/kN': 'kN^-1',
  'kN/rad': 'kN',
  deg: 'deg',
  rad: 'rad',
}
const LONGEST = 500
const NODES = new Set([
  'ConstantNode',
  'SymbolNode',
  'OperatorNode',
  'FunctionNode',
  'ConditionalNode',
  'ParenthesisNode',
])
const FUNCTIONS = new Set([
  'min',
  'max',
  'sqrt',
  'exp',
  'log',
  'log10',
  'sin',
  'cos',
  'tan',
  'atan',
  'tanh',
  'abs',
  'ceil',
])
const OPERATORS = new Set(['+', '-', '*', '/', '^', '<', '<=', '>', '>=', '=='])

type Value = number | Unit
export type Amount = { readonly value: number; readonly unit: string }

const isUnit = (v: unknown): v is Unit => math.isUnit(v)
const isAngle = (unit: string) => unit === 'deg' || unit === 'rad'

/** A quantity for mathjs; angles and ratios as plain numbers (radians). */
function amountIn({ value, unit }: Amount): Value {
  if (unit === '1') return value
  if (isAngle(unit)) return math.unit(value, unit).toNumber('rad')
  const known = Object.hasOwn(written, unit) ? written[unit] : undefined
  if (!known) throw new Error(`unknown unit ${unit}`)
  return math.unit(value, known)
}

const smallest =
  (sign: number) =>
  (...values: Value[]): Value =>
    values.reduce((a, b) => {
      const gap = math.subtract(a as Unit, b as Unit) as unknown as Value
      const difference = isUnit(gap) ? gap.toJSON().value : gap
      return sign *
        Number(isUnit(gap) ? math.unit(Number(difference), gap.formatUnits()).toSI().toNumeric() : difference) <=
        0
        ? a
        : b
    })

/** Refuses all but arithmetic on the printed operands: a trace may come from anybody. */
function vet(node: MathNode, symbols: ReadonlySet<string>): void {
  node.traverse((n, path, parent) => {
    if (!NODES.has(n.type)) throw new Error(`${n.type} is not allowed`)
    const named = n as unknown as { name?: string; op?: string; value?: unknown }
    if (n.type === 'FunctionNode' && !FUNCTIONS.has(named.name ?? ''))
      throw new Error(`function ${named.name} is not allowed`)
    if (n.type === 'OperatorNode' && !OPERATORS.has(named.op ?? ''))
      throw new Error(`operator ${named.op} is not allowed`)
    if (n.type === 'ConstantNode' && typeof named.value !== 'number')
      throw new Error('only numbers may stand as constants')
    const isFunctionName = parent?.type === 'FunctionNode' && path === 'fn'
    if (
      n.type === 'SymbolNode' &&
      !isFunctionName &&
      named.name !== 'pi' &&
      !symbols.has(named.name ?? '') &&
      !Object.hasOwn(written, named.name ?? '')
    ) {
      throw new Error(`unknown symbol ${named.name}`)
    }
  })
}

const parsed = new Map<string, MathNode>()

/** Evaluates a printed formula with units. Throws when it is not arithmetic, or its dimension is not `unit`. */
export function evaluateFormula(
  text: string,
  operands: readonly (Amount & { readonly symbol: string })[],
  unit: string,
): number {
  if (text.length > LONGEST) throw new Error('the formula is too long')
  const node = parsed.get(text) ?? math.parse(text)
  if (parsed.size < 1000) parsed.set(text, node)
  vet(node, new Set(operands.map((o) => o.symbol)))
  const unused = operands.filter(
    (o) => !node.filter((n) => n.type === 'SymbolNode' && (n as unknown as { name: string }).name === o.symbol).length,
  )
  if (unused.length > 0) throw new Error(`operand ${unused[0]!.symbol} is not used`)
  const scope = new Map<string, unknown>(operands.map((o) => [o.symbol, amountIn(o)]))
  scope.set('min', smallest(1))
  scope.set('max', smallest(-1))
  return numberIn(node.evaluate(scope) as unknown, unit)
}

function numberIn(value: unknown, unit: string): number {
  if (unit === '1' || isAngle(unit)) {
    const ratio =
      isUnit(value) && value.dimensions.every((d) => Math.abs(d) < 1e-12) ? Number(value.toSI().toNumeric()) : value
    if (typeof ratio !== 'number') throw new Error('the dimension is not that of a ratio')
    return unit === 'deg' ? math.unit(ratio, 'rad').toNumber('deg') : ratio
  }
  if (!isUnit(value)) throw new Error(`the formula has no dimension, ${unit} was printed`)
  return value.toNumber(written[unit]!)
}
