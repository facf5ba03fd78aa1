import { scaleLinear } from 'd3-scale'
import { positions, sectionWidth } from '../../engine/index.ts'
import { short } from '../figure.ts'
import { html, joined, type Markup, trusted } from '../markup.ts'
import type { PlanCap } from '../plan-view.ts'
import type { AssessmentRecord } from '../record.ts'
import { contours } from './contours.ts'
import { coursesPath } from './courses.ts'
import { round } from './frame.ts'

/** Distance between neighbouring caps on the drawing: wide where there are few, since utilisations stand beside them. */
const [WIDE, NARROW, FEW] = [180, 104, 40]
/** Two revisions stand beside each other on a usual screen when each keeps to HALF; caps closer than LEAST would cover each other. */
const [HALF, LEAST] = [390, 76]
const [LARGEST, MARGIN] = [3600, 64]
/** Beyond this many caps the single piles would be dots of ink: their outline stands for them. */
const MOST_WITH_PILES = 150

/** All caps in plan, to scale, with their utilisation, lines of equal settlement and neighbours that distort too much. */
export function planMap(
  id: string,
  record: AssessmentRecord,
  caps: readonly PlanCap[],
  title: string,
  /** Another revision that is drawn beside this one: both over the same ground, to one scale, with the same lines. */
  beside?: { readonly record: AssessmentRecord; readonly caps: readonly PlanCap[] },
): Markup {
  const all = [...caps, ...(beside?.caps ?? [])]
  const [x0, x1, y0, y1] = [
    Math.min(...all.map((c) => c.x)),
    Math.max(...all.map((c) => c.x)),
    Math.min(...all.map((c) => c.y)),
    Math.max(...all.map((c) => c.y)),
  ]
  const extent = Math.max(x1 - x0, y1 - y0, 1)
  const apart = usualDistance(beside ? [record, beside.record] : [record])
  const usual = Math.min((beside || caps.length > FEW ? NARROW : WIDE) / apart, LARGEST / extent)
  const scale = beside ? Math.min(usual, Math.max(HALF / (x1 - x0 || 1), LEAST / apart)) : usual
  const x = scaleLinear([x0, x1 === x0 ? x0 + 1 : x1], [MARGIN, MARGIN + Math.max(1, (x1 - x0) * scale)])
  const y = scaleLinear([y0, y1 === y0 ? y0 + 1 : y1], [MARGIN + Math.max(1, (y1 - y0) * scale), MARGIN])
  const [width, height] = [(x1 - x0) * scale + 2 * MARGIN + 40, (y1 - y0) * scale + 2 * MARGIN + 30]
  const levels = settlementLevels(all)
  const lines = contours(
    caps.flatMap((c) => (c.settlement === undefined ? [] : [{ x: x(c.x), y: y(c.y), value: c.settlement }])),
    levels,
  )
  // What a label of a contour keeps clear of: each cap, and its mark below it.
  const discs = caps.flatMap((c): Disc[] => {
    const r = reach(record, c) * scale
    return [
      [x(c.x), y(c.y), r],
      [x(c.x) - r + 34, y(c.y) + r + 8, 14],
    ]
  })
  const labels: Spot[] = []
  const drawn = lines.map(({ level, segments }) => {
    const d = segments.map(([a, b, c, e]) => `M${round(a)} ${round(b)}L${round(c)} ${round(e)}`).join('')
    const at = labelPlace(segments, labels, discs)
    if (at) labels.push(at)
    return html`<path class="contour" d="${d}"/>${at && html`<text class="tick halo mid" x="${round(at[0])}" y="${round(at[1] + 3)}">${short(level)} mm</text>`}`
  })
  const places = new Map(caps.map((c) => [c.mark, c]))
  const pairs = record.reply.result.neighbours.map((n) => {
    const [a, b] = [places.get(n.a), places.get(n.b)]
    if (!a || !b || n.satisfied !== false || n.utilisation === undefined) return undefined
    const [xa, ya, xb, yb] = [x(a.x), y(a.y), x(b.x), y(b.y)]
    return html`<path class="strained" d="M${round(xa)} ${round(ya)}L${round(xb)} ${round(yb)}"/><path class="strained inner" d="M${round(xa)} ${round(ya)}L${round(xb)} ${round(yb)}"/><text class="label halo over mid" x="${round((xa + xb) / 2)}" y="${round((ya + yb) / 2 + 4)}">${short(n.utilisation)}</text>`
  })
  const marks = caps.map((cap) => capMark(record, cap, x, y, scale, caps.length <= MOST_WITH_PILES))
  const bottom = height - 18
  const ticks = x.ticks(Math.max(2, Math.min(8, width / 120))).filter((t) => t >= x0 && t <= x1)
  return html`<svg class="drawing map" viewBox="0 0 ${round(width)} ${round(height)}" width="${round(width)}" height="${round(height)}" role="img" aria-labelledby="${id}-t"><title id="${id}-t">${title}</title>${joined(drawn)}${joined(pairs)}${joined(marks)}<path class="axis" d="M${MARGIN} ${round(bottom)}H${round(width - MARGIN - 40)}"/>${ticks.map((t) => html`<path class="axis" d="M${round(x(t))} ${round(bottom)}v-4"/><text class="tick mid" x="${round(x(t))}" y="${round(bottom + 13)}">${short(t)}</text>`)}<text class="unit" x="${round(width - MARGIN - 34)}" y="${round(bottom + 4)}">x, m</text></svg>`
}

type Scale = (n: number) => number
type Spot = readonly [x: number, y: number]
type Disc = readonly [x: number, y: number, radius: number]

/** Where the label of a contour stands clear of other labels and of the caps; nowhere, where it would not. */
function labelPlace(
  segments: readonly (readonly [number, number, number, number])[],
  labels: readonly Spot[],
  discs: readonly Disc[],
): Spot | undefined {
  const every = Math.max(1, Math.floor(segments.length / 12))
  const near = ([x, y]: Spot, all: readonly (Spot | Disc)[]) =>
    all.reduce((least, [a, b, radius = 0]) => Math.min(least, Math.hypot(a - x, b - y) - radius), 1e9)
  let best: Spot | undefined
  let room = 0
  for (let i = 0; i < segments.length; i += every) {
    const [a, b, c, e] = segments[i]!
    const at: Spot = [(a + c) / 2, (b + e) / 2]
    const own = Math.min(near(at, labels), near(at, discs))
    if (own > room) [best, room] = [at, own]
  }
  return room > 22 ? best : undefined
}

function capMark(
  record: AssessmentRecord,
  cap: PlanCap,
  x: Scale,
  y: Scale,
  scale: number,
  withPiles: boolean,
): Markup {
  const given = record.schedule.caps[cap.index]!
  const section = record.schedule.pileTypes[given.pileType]!.section
  const d = sectionWidth(section)
  const points = positions(given.layout)
  const [a, b] = [Math.min(...points.map((p) => p.x)) - d, Math.max(...points.map((p) => p.x)) + d]
  const [e, f] = [Math.min(...points.map((p) => p.y)) - d, Math.max(...points.map((p) => p.y)) + d]
  const [cx, cy] = [x(cap.x), y(cap.y)]
  const r = round((d * scale) / 2)
  const piles =
    withPiles &&
    trusted(
      `<path class="heads" d="${points.map((p) => `M${round(cx + p.x * scale - r)} ${round(cy - p.y * scale)}a${r} ${r} 0 1 0 ${2 * r} 0a${r} ${r} 0 1 0 ${-2 * r} 0`).join('')}"/>`,
    )
  const right = round(cx + b * scale)
  const low = round(cy - e * scale)
  const u = cap.shown?.utilisation
  const sign = u === undefined ? undefined : coursesPath(u, right + 5, low, 18, 3)
  return html`<g class="cap${cap.shown?.satisfied === false && ' exceeds'}" data-cap="${cap.index}"><rect class="outline" x="${round(cx + a * scale)}" y="${round(cy - f * scale)}" width="${round((b - a) * scale)}" height="${round((f - e) * scale)}"/>${piles}${
    sign &&
    html`<path class="laid" d="${sign.laid}"/><path class="frame" d="${sign.frame}"/>${sign.cross !== '' && html`<path class="over" d="${sign.cross}"/>`}`
  }<text class="label halo" x="${round(cx + a * scale)}" y="${round(low + 12)}"><tspan class="capmark">${cap.mark}</tspan>${u !== undefined && html` ${short(u)}`}</text></g>`
}

/** The distance at which neighbouring caps usually stand, m: the middle one, so that a lone cap far off does not shrink the rest. */
function usualDistance(records: readonly AssessmentRecord[]): number {
  const distances = records.flatMap(({ reply }) => reply.result.neighbours.map((n) => n.distance)).sort((a, b) => a - b)
  return distances[Math.floor(distances.length / 4)] || 10
}

/** How far the outline of a cap reaches from its place, m. */
function reach({ schedule }: AssessmentRecord, { index }: PlanCap): number {
  const { layout, pileType } = schedule.caps[index]!
  const points = positions(layout).map((p) => Math.max(Math.abs(p.x), Math.abs(p.y)))
  return Math.max(...points) + sectionWidth(schedule.pileTypes[pileType]!.section)
}

function settlementLevels(caps: readonly PlanCap[]): number[] {
  const known = caps.flatMap((c) => c.settlement ?? [])
  return known.length < 3 ? [] : scaleLinear([Math.min(...known), Math.max(...known)], [0, 1]).ticks(7)
}
