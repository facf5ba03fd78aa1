/**
 * How a number is printed. Seven figures, fewer where it is exact in fewer; the figures after the fourth (in whole numbers after
 * the last whole one) are guard figures, set small. One number looks the same wherever it stands, as a result and as an operand, so
 * that a line can be followed by eye and re-computed from the paper. From 100 000 and below 0.001 with a power of ten.
 */
export type Figure = {
  readonly sign: '' | '−'
  readonly main: string
  readonly guard: string
  readonly power?: number
}

export const FIGURES = 7
const PLAIN = 4

export function figure(value: number): Figure {
  const sign = value < 0 ? '−' : ''
  const size = Math.abs(value)
  if (size === 0) return { sign: '', main: '0', guard: '' }
  if (size < 1e-3 || Number(size.toPrecision(FIGURES)) >= 1e5) {
    const [mantissa = '', power = ''] = size.toExponential(FIGURES - 1).split('e')
    return { sign, ...split(trimmed(mantissa)), power: Number(power) }
  }
  return { sign, ...split(trimmed(size.toPrecision(FIGURES))) }
}

const trimmed = (digits: string) => (digits.includes('.') ? digits.replace(/\.?0+$/, '') : digits)

function split(digits: string): { main: string; guard: string } {
  const point = digits.indexOf('.')
  if (point === -1) return { main: digits, guard: '' }
  const leading = /^0\.0*/.exec(digits)?.[0].length ?? 0
  const after = leading > 0 ? leading + PLAIN : point >= PLAIN ? point : PLAIN + 1
  return { main: digits.slice(0, after), guard: digits.slice(after) }
}

/** Four figures in plain text, for drawings and headings; power of ten as in `figure`. */
export function short(value: number): string {
  if (value === 0) return '0'
  const sign = value < 0 ? '−' : ''
  const size = Math.abs(value)
  if (size < 1e-3 || size >= 1e5) {
    const [mantissa = '', power = ''] = size.toExponential(PLAIN - 1).split('e')
    return `${sign}${trimmed(mantissa)}×10${raised(Number(power))}`
  }
  return `${sign}${size >= 1000 ? size.toFixed(0) : trimmed(size.toPrecision(PLAIN))}`
}

const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹'
export const raised = (n: number): string =>
  (n < 0 ? '⁻' : '') + [...String(Math.abs(n))].map((digit) => RAISED[Number(digit)]).join('')
