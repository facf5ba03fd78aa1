import type { UnitCode } from '../engine/quantities/units.ts'
import { figure, short } from './figure.ts'
import { html, type Markup, trusted } from './markup.ts'

const written: Readonly<Record<UnitCode, string>> = {
  '1': '',
  m: 'm',
  m2: 'm²',
  m3: 'm³',
  m4: 'm⁴',
  mm: 'mm',
  '1/m': '1/m',
  kN: 'kN',
  kPa: 'kPa',
  'kN/m': 'kN/m',
  'kN/m3': 'kN/m³',
  'kN.m': 'kN·m',
  'kN.m/rad': 'kN·m/rad',
  'rad/(kN.m)': 'rad/(kN·m)',
  'm/kN': 'm/kN',
  '1/kN': '1/kN',
  'kN/rad': 'kN/rad',
  deg: '°',
  rad: 'rad',
}

/** A unit as the trade writes it; nothing for a ratio. */
export const unitLabel = (unit: UnitCode): string => written[unit]

/** A number with its guard figures set small. */
export function number(value: number): Markup {
  const { sign, main, guard, power } = figure(value)
  const small = guard && `<small>${guard}</small>`
  const times = power === undefined ? '' : ` × 10<sup>${String(power).replace('-', '−')}</sup>`
  return trusted(`${sign}${main}${small}${times}`)
}

/** A number and its unit, kept on one line. */
export function quantity(value: number, unit: UnitCode): Markup {
  const label = unitLabel(unit)
  const gap = label === '' || label === '°' ? '' : '\u202f'
  return html`<span class="q">${number(value)}${gap}${label}</span>`
}

/** Number and unit as plain text with four figures. */
export function shortQuantity(value: number, unit: UnitCode): string {
  const label = unitLabel(unit)
  return `${short(value)}${label === '' || label === '°' ? label : `\u202f${label}`}`
}

const mathUnit = (unit: UnitCode): string => {
  const label = unitLabel(unit)
  if (label === '') return ''
  return `${label === '°' ? '' : '<mspace width="0.17em"></mspace>'}<mtext>${label}</mtext>`
}

/** The same in MathML. */
export function mathQuantity(value: number, unit: UnitCode): string {
  const { sign, main, guard, power } = figure(value)
  const small = guard && `<mn class="g">${guard}</mn>`
  const times =
    power === undefined ? '' : `<mo>×</mo><msup><mn>10</mn><mn>${String(power).replace('-', '−')}</mn></msup>`
  return `${sign && '<mo form="prefix">−</mo>'}<mn>${main}</mn>${small}${times}${mathUnit(unit)}`
}

export const hasPower = (value: number): boolean => figure(value).power !== undefined
