/** TeX of the atoms of a line: symbols, numbers, units. */

const GREEK = new Set(
  (
    'alpha beta gamma delta epsilon zeta eta theta iota kappa lambda mu nu xi pi rho sigma tau upsilon phi chi psi omega ' +
    'Gamma Delta Theta Lambda Xi Pi Sigma Upsilon Phi Psi Omega'
  ).split(' '),
)
/** The forms that the trade writes, where TeX has two. */
const VARIANTS: Readonly<Record<string, string>> = { phi: 'varphi', epsilon: 'varepsilon' }
const greek = (name: string): string | undefined => (GREEK.has(name) ? `\\${VARIANTS[name] ?? name}` : undefined)
/** Subscripts that count or name an axis are set like variables, all others like words. */
const RUNNING = new Set(['i', 'j', 'x', 'y', 'z'])
const SPECIAL: Readonly<Record<string, string>> = {
  '\\': '\\textbackslash{}',
  '~': '\\textasciitilde{}',
  '^': '\\textasciicircum{}',
}
const words = (text: string) => `\\text{${text.replace(/[\\~^]|[#$%&_{}]/g, (c) => SPECIAL[c] ?? `\\${c}`)}}`
const isWord = (text: string) => /^[A-Za-z0-9]+$/.test(text)

function subscript(part: string): string {
  return greek(part) ?? (RUNNING.has(part) || /^\d+$/.test(part) ? part : `\\mathrm{${part}}`)
}

/** `c_u` with a subscript, `sigma_v` in Greek, `OCR` upright; a symbol that is words stays words. */
export function texSymbol(symbol: string): string {
  const [head = '', ...below] = symbol.split('_')
  if (!/^[A-Za-z][A-Za-z0-9]*$/.test(head) || !below.every(isWord)) return words(symbol)
  const base = greek(head) ?? (head.length === 1 ? head : `\\mathrm{${head}}`)
  return below.length === 0 ? base : `${base}_{${below.map(subscript).join(', ')}}`
}

/** A number as printed by JavaScript, but with a power of ten below 0.001 and from a million. */
export function texNumber(value: number): string {
  const size = Math.abs(value)
  if (size === 0) return '0'
  if (size >= 1e-3 && size < 1e6) return String(value)
  const [mantissa = '', exponent = ''] = value.toExponential().split('e')
  const power = `10^{${Number(exponent)}}`
  if (mantissa === '1') return power
  return mantissa === '-1' ? `-${power}` : `${mantissa} \\times ${power}`
}

/** A UCUM code upright, powers raised; empty for a ratio. An unknown code is set as words. */
export function texUnit(code: string): string {
  if (code === '1') return ''
  if (code === 'deg') return '^{\\circ}'
  if (!/^[A-Za-z0-9./()]+$/.test(code)) return words(code)
  return code
    .replace(/[A-Za-z]+/g, (name) => `\\mathrm{${name}}`)
    .replace(/\}(\d)/g, '}^{$1}')
    .replaceAll('.', ' \\cdot ')
}

/** A number and its unit, a thin space between; degrees stand close. */
export function texQuantity(number: string, unit: string): string {
  if (unit === '') return number
  return unit.startsWith('^') ? `${number}${unit}` : `${number}\\,${unit}`
}
