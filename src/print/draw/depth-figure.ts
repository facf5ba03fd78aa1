import { type ScaleLinear, scaleLinear } from 'd3-scale'
import type { GroundProfile, Layer, Varying } from '../../engine/ground/profile-types.ts'
import { sectionWidth } from '../../engine/index.ts'
import type { PileType } from '../../engine/piles/pile-type.ts'
import { short } from '../figure.ts'
import { html, joined, type Markup } from '../markup.ts'
import { figureOf, patterns, round } from './frame.ts'

/** A stretch of the shaft: depths in m, unit resistance in kPa, resistance in kN. */
export type Stretch = {
  readonly top: number
  readonly bottom: number
  readonly unit: number
  readonly resistance?: number
}
export type DepthView = {
  readonly ground: GroundProfile
  readonly pile: PileType
  readonly shaft: readonly Stretch[]
  /**
   * Load at head and toe of the pile, kN: those at which the ultimate resistance is reached; with `along`, loads at depths under
   * a given load.
   */
  readonly axial?: {
    readonly head: number
    readonly toe: number
    readonly along?: readonly { readonly depth: number; readonly load: number }[]
  }
  readonly uplift: boolean
}

type Band = { readonly layer: Layer; readonly top: number; readonly bottom: number; readonly goesOn: boolean }
type Panel = { readonly x: number; readonly width: number; readonly title: string; readonly unit: string }

const HEIGHT = 420
const TOP = 54

/** Ground, pile, strength, stiffness, unit shaft resistance and axial load on one scale of depth; the pile is to scale in both directions. */
export function depthFigure(id: string, view: DepthView): Markup {
  const { pile, ground } = view
  const head = pile.headDepth ?? 0
  const toe = head + pile.length
  const bands = bandsOf(ground, toe * 1.15 + 0.5)
  const z = scaleLinear([0, Math.max(bands.at(-1)!.bottom, toe * 1.04)], [TOP, TOP + HEIGHT])
  const shown = [
    {
      width: 212,
      draw: (p: Panel) => column(id, view, bands, z, p.x, p.width, head, toe),
      title: 'ground and pile',
      unit: '',
    },
    { width: 104, draw: (p: Panel) => varying(p, bands, z, strength, 'c_u or q_u'), title: 'strength', unit: 'kPa' },
    {
      width: 118,
      draw: (p: Panel) => varying(p, bands, z, (l) => l.youngsModulus, 'E'),
      title: 'stiffness E',
      unit: 'kPa',
    },
    ...(view.shaft.length > 0
      ? [
          {
            width: 118,
            draw: (p: Panel) => unitShaft(p, view.shaft, z),
            title: view.axial?.along ? 'shaft stress' : 'unit shaft resistance',
            unit: 'kPa',
          },
        ]
      : []),
    ...(view.axial
      ? [
          {
            width: 118,
            draw: (p: Panel) => axial(p, view, z, head, toe),
            title: view.uplift ? 'pull in the pile' : 'load in the pile',
            unit: 'kN',
          },
        ]
      : []),
  ]
  let x = 50
  const panels = shown.map(({ width, draw, title, unit }) => {
    const panel = { x, width, title, unit }
    x += width + 14
    return html`<g><text class="head" x="${panel.x}" y="16">${title}</text>${unit && html`<text class="unit" x="${panel.x}" y="30">${unit}</text>`}${draw(panel)}</g>`
  })
  return figureOf(
    {
      id,
      width: x,
      height: TOP + HEIGHT + 26,
      title: `Ground and pile with depth${ground.name ? `, ${ground.name}` : ''}`,
      description: `Depth in m below the surface, pile to scale. Dashes: cohesive, dots: granular, courses: rock; triangle: water table and its depth.${
        view.axial?.along
          ? ' Stress and load are those under the given load.'
          : view.axial
            ? ' Loads are those at which the ultimate resistance is reached.'
            : ''
      }`,
    },
    html`${patterns(id)}${depthAxis(z, x)}${joined(panels)}`,
  )
}

function bandsOf(ground: GroundProfile, deepest: number): Band[] {
  let top = 0
  const bands: Band[] = []
  for (const layer of ground.layers) {
    const goesOn = layer.thickness === undefined || top + layer.thickness > deepest * 1.6
    const bottom = goesOn ? Math.max(deepest, top + deepest * 0.12) : top + layer.thickness!
    bands.push({ layer, top, bottom, goesOn: layer.thickness === undefined || goesOn })
    top = bottom
    if (goesOn || top >= deepest) break
  }
  return bands
}

function depthAxis(z: ScaleLinear<number, number>, width: number): Markup {
  const ticks = z
    .ticks(10)
    .map(
      (t) =>
        html`<path class="grid" d="M44 ${round(z(t))}H${round(width - 10)}"/><text class="tick end" x="40" y="${round(z(t) + 4)}">${t}</text>`,
    )
  return html`<text class="unit end" x="40" y="${TOP - 16}">z, m</text>${joined(ticks)}`
}

const strength = (layer: Layer): Varying | undefined =>
  layer.soil === 'cohesive'
    ? layer.undrainedShearStrength
    : layer.soil === 'rock'
      ? layer.unconfinedCompressiveStrength
      : undefined

function column(
  id: string,
  view: DepthView,
  bands: readonly Band[],
  z: ScaleLinear<number, number>,
  x: number,
  width: number,
  head: number,
  toe: number,
): Markup {
  const { pile, ground } = view
  const scale = z(1) - z(0)
  const across = Math.max(4, sectionWidth(pile.section) * scale)
  const foot = Math.max(across, (pile.baseDiameter ?? 0) * scale)
  const axis = x + width - 34 - foot / 2
  const soils = bands.map(({ layer, top, bottom, goesOn }) => {
    const [a, b] = [z(top), z(bottom)]
    const tall = b - a
    const thick = layer.thickness === undefined ? 'goes on' : `${short(layer.thickness)} m thick`
    return html`<rect class="soil" fill="url(#${id}-${layer.soil})" x="${x}" y="${round(a)}" width="${width}" height="${round(tall)}"/><path class="${goesOn ? 'edge open' : 'edge'}" d="M${x} ${round(b)}h${width}"/>${
      tall > 13 && html`<text class="label halo" x="${x + 5}" y="${round(a + 13)}">${layer.name}</text>`
    }${tall > 27 && html`<text class="note halo" x="${x + 5}" y="${round(a + 26)}">${thick}</text>`}${
      tall > 40 &&
      html`<text class="note halo" x="${x + 5}" y="${round(a + 39)}">γ ${short(layer.unitWeight)} kN/m³${angle(layer)}</text>`
    }`
  })
  const water = ground.waterTableDepth
  const [h, t] = [z(head), z(toe)]
  const bell =
    foot > across
      ? html`<rect class="pile" fill="url(#${id}-pile)" x="${round(axis - foot / 2)}" y="${round(t - foot / 2)}" width="${round(foot)}" height="${round(foot / 2)}"/>`
      : undefined
  const dim = x + width - 11
  return html`${joined(soils)}<path class="surface" d="M${x} ${z(0)}h${width}"/>
<rect class="pile white" x="${round(axis - across / 2)}" y="${round(h)}" width="${round(across)}" height="${round(t - h)}"/><rect class="pile" fill="url(#${id}-pile)" x="${round(axis - across / 2)}" y="${round(h)}" width="${round(across)}" height="${round(t - h)}"/>${bell}
<path class="dim" marker-start="url(#${id}-end)" marker-end="url(#${id}-end)" d="M${dim} ${round(h)}V${round(t)}"/><text class="label halo mid" transform="translate(${dim - 6} ${round((h + t) / 2)}) rotate(-90)">L ${short(pile.length)} m</text>
<path class="dim" d="M${round(axis - across / 2)} ${round(h - 8)}h${round(across)}M${round(axis - across / 2)} ${round(h - 12)}v12M${round(axis + across / 2)} ${round(h - 12)}v12"/><text class="label halo mid" x="${round(axis)}" y="${TOP - 6}">d ${short(sectionWidth(pile.section))} m</text>
${water !== undefined && z(water) < TOP + HEIGHT && html`<path class="water" d="M${x + 114} ${round(z(water))}h${width - 114}"/><path class="watermark" d="M${x + 122} ${round(z(water))}l-5 -8h10z"/><text class="note halo" x="${x + 130}" y="${round(z(water) - 2)}">${short(water)} m</text>`}`
}

const angle = (layer: Layer): string =>
  layer.soil === 'granular' && layer.frictionAngle !== undefined ? `, φ′ ${short(layer.frictionAngle)}°` : ''

/** Axis above a panel, in its unit; the ruler of the drawing. */
function across(panel: Panel, largest: number): { x: ScaleLinear<number, number>; axis: Markup } {
  const x = scaleLinear([0, largest || 1], [panel.x, panel.x + panel.width - 6]).nice(largest >= 10_000 ? 2 : 3)
  const ticks = x
    .ticks(largest >= 10_000 ? 2 : 3)
    .map(
      (t) =>
        html`<path class="grid" d="M${round(x(t))} ${TOP}v${HEIGHT}"/><text class="tick mid" x="${round(x(t))}" y="${TOP - 6}">${short(t)}</text>`,
    )
  return {
    x,
    axis: html`<path class="axis" d="M${panel.x} ${TOP}h${panel.width - 6}M${panel.x} ${TOP}v${HEIGHT}"/>${joined(ticks)}`,
  }
}

function varying(
  panel: Panel,
  bands: readonly Band[],
  z: ScaleLinear<number, number>,
  of: (layer: Layer) => Varying | undefined,
  what: string,
): Markup {
  const given = bands.flatMap((b) => {
    const value = of(b.layer)
    if (value === undefined) return []
    const ends = typeof value === 'number' ? { top: value, bottom: value } : value
    return [{ ...b, ...{ from: ends.top, to: ends.bottom } }]
  })
  if (given.length === 0) return html`<text class="note" x="${panel.x}" y="${TOP + 16}">none given</text>`
  const { x, axis } = across(panel, Math.max(...given.map((g) => Math.max(g.from, g.to))))
  const lines = given.map((g) => {
    const [a, b] = [z(g.top), z(g.bottom)]
    const place = (v: number, y: number) => {
      const left = x(v) > panel.x + panel.width * 0.55
      return html`<text class="label halo ${left ? 'end' : ''}" x="${round(x(v) + (left ? -4 : 4))}" y="${round(y)}">${short(v)}</text>`
    }
    return html`<path class="profile" d="M${round(x(g.from))} ${round(a)}L${round(x(g.to))} ${round(b)}"/>${
      g.from === g.to
        ? place(g.from, (a + b) / 2 + 4)
        : html`${place(g.from, a + 12)}${b - a > 26 && place(g.to, b - 4)}`
    }`
  })
  return html`<g aria-label="${what}">${axis}${joined(lines)}</g>`
}

function unitShaft(panel: Panel, shaft: readonly Stretch[], z: ScaleLinear<number, number>): Markup {
  const largest = Math.max(...shaft.map((s) => s.unit))
  const { x, axis } = across(panel, largest)
  const bars = shaft.map((s) => `M${panel.x} ${round(z(s.top))}H${round(x(s.unit))}V${round(z(s.bottom))}H${panel.x}`)
  const peaks = shaft.filter((s, i) => (shaft[i - 1]?.unit ?? -1) < s.unit && (shaft[i + 1]?.unit ?? -1) <= s.unit)
  const labels = peaks.map((s) => {
    const left = x(s.unit) > panel.x + panel.width * 0.6
    return html`<text class="label halo ${left ? 'end' : ''}" x="${round(x(s.unit) + (left ? -4 : 4))}" y="${round((z(s.top) + z(s.bottom)) / 2 + 4)}">${short(s.unit)}</text>`
  })
  return html`${axis}<path class="bars" d="${bars.join('')}"/>${joined(labels)}`
}

function axial(panel: Panel, view: DepthView, z: ScaleLinear<number, number>, head: number, toe: number): Markup {
  const ends = view.axial!
  const { x, axis } = across(panel, ends.head)
  const points =
    ends.along?.map((p): [number, number] => [p.load, p.depth]) ?? shedLoads(view.shaft, ends.head, head, toe)
  const path = points
    .map(([q, depth], i) => `${i === 0 ? 'M' : 'L'}${round(x(Math.max(0, q)))} ${round(z(depth))}`)
    .join('')
  const toeLeft = x(ends.toe) > panel.x + panel.width * 0.55
  return html`${axis}<path class="profile" d="${path}"/><path class="profile" d="M${panel.x} ${round(z(toe))}H${round(x(ends.toe))}"/><text class="label halo end" x="${round(x(ends.head) - 4)}" y="${round(z(head) - 4)}">${short(ends.head)}</text><text class="label halo ${toeLeft ? 'end' : ''}" x="${round(x(ends.toe) + (toeLeft ? -4 : 4))}" y="${round(z(toe) + 13)}">${short(ends.toe)}</text>`
}

/** The ultimate resistance from the head down, less what the shaft has taken. */
function shedLoads(shaft: readonly Stretch[], atHead: number, head: number, toe: number): [number, number][] {
  let load = atHead
  const points: [number, number][] = [[load, head]]
  for (const s of shaft) {
    points.push([load, s.top])
    load -= s.resistance ?? 0
    points.push([load, s.bottom])
  }
  return [...points, [load, toe]]
}
