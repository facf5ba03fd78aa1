import type { DesignBasis } from '../engine/design-basis/design-basis.ts'
import type { GroundProfile, Layer } from '../engine/ground/profile-types.ts'
import type { MethodChoices } from '../engine/methods/method-choice.ts'
import type { PileType, Section } from '../engine/piles/pile-type.ts'
import { short } from './figure.ts'
import { html, joined, type Markup } from './markup.ts'
import { symbol } from './symbol.ts'

export type GivenWords = {
  readonly pile: PileType
  readonly ground: GroundProfile
  readonly designBasis?: DesignBasis
  readonly methods?: MethodChoices
}

/** What is given, in words: the pile, the ground layer by layer, the design basis, the methods that were asked for. */
export function givenWords({ pile, ground, designBasis, methods }: GivenWords): Markup {
  const asked = Object.entries(methods ?? {}).filter(
    ([, choice]) => typeof choice === 'string' || 'method' in Object(choice),
  )
  return html`<dl class="words">
<div><dt>pile</dt><dd>${sectionWords(pile.section)}, ${short(pile.length)} m long, ${pile.installation.replaceAll('-', ' ')}; head ${short(pile.headDepth ?? 0)} m below the surface${pile.baseDiameter !== undefined && html`; base widened to ${short(pile.baseDiameter)} m`}</dd></div>
<div><dt>ground</dt><dd>${ground.name}<ol class="layers">${joined(ground.layers.map((layer) => html`<li>${layer.name}${layer.thickness === undefined ? ', goes on' : html`, ${short(layer.thickness)} m`}: ${layer.soil}, γ ${short(layer.unitWeight)} kN/m³${parameters(layer)}</li>`))}</ol>${ground.waterTableDepth === undefined ? 'no water' : html`water table at ${short(ground.waterTableDepth)} m`}</dd></div>
${designBasis && html`<div><dt>design basis</dt><dd>${basisWords(designBasis)}</dd></div>`}
${asked.length > 0 && html`<div><dt>methods asked for</dt><dd>${asked.map(([part, choice], i) => html`${i > 0 && '; '}${part} ${typeof choice === 'string' ? choice : (choice as { method: string }).method}`)}</dd></div>`}
</dl>`
}

function sectionWords(section: Section): string {
  switch (section.shape) {
    case 'circular':
      return `circular, ${short(section.diameter)} m`
    case 'square':
      return `square, ${short(section.width)} m`
    case 'tubular':
      return `tube, ${short(section.diameter)} m, wall ${short(section.wallThickness)} m, toe ${section.toe}`
    case 'h':
      return `H section, ${short(section.depth)} m × ${short(section.flangeWidth)} m`
  }
}

const names: Readonly<Record<string, readonly [symbol: string, unit: string]>> = {
  undrainedShearStrength: ['c_u', ' kPa'],
  frictionAngle: ['phi', '°'],
  effectiveFrictionAngle: ['phi', '°'],
  unconfinedCompressiveStrength: ['q_u', ' kPa'],
  coneResistance: ['q_c', ' kPa'],
  sptN60: ['N_60', ''],
  plasticityIndex: ['PI', ' %'],
  overconsolidationRatio: ['OCR', ''],
  relativeDensity: ['D_r', ' %'],
  rqd: ['RQD', ' %'],
  youngsModulus: ['E', ' kPa'],
  poissonsRatio: ['nu', ''],
}

function parameters(layer: Layer): Markup {
  return joined(
    Object.entries(layer).map(([key, value]) => {
      const name = names[key]
      if (!name || value === undefined) return undefined
      const ends = typeof value === 'object' ? `${short(value.top)} to ${short(value.bottom)}` : short(value as number)
      return html`, ${symbol(name[0])} ${ends}${name[1]}`
    }),
  )
}

/** Factors are numbers of the request; each stands in the lines again, with its use. */
function basisWords(basis: DesignBasis): Markup {
  const { format, ...rest } = basis
  const factors = flat(rest).map(([name, value]) => html`, ${name} ${value}`)
  return html`${format}${joined(factors)}`
}

function flat(node: object, at = ''): [string, string][] {
  return Object.entries(node).flatMap(([key, value]): [string, string][] => {
    const name = at ? `${at} ${key}` : key
    if (typeof value === 'object' && value !== null) return flat(value, name)
    return value === undefined ? [] : [[name, typeof value === 'number' ? short(value) : String(value)]]
  })
}
