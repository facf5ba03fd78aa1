import { scaleLinear } from 'd3-scale'
import { type Point, sectionWidth } from '../../engine/index.ts'
import type { Section } from '../../engine/piles/pile-type.ts'
import { short } from '../figure.ts'
import { html, joined, type Markup } from '../markup.ts'
import { figureOf, patterns, round } from './frame.ts'

export type LayoutView = {
  readonly points: readonly Point[]
  readonly section: Section
  /** Outline of the block: its two sides in m, and the direction of the first in rad. */
  readonly block?: { readonly breadth: number; readonly length: number; readonly angle: number }
  /** Load of each pile in kN where it is known, in the order of the layout. */
  readonly loads?: readonly (number | undefined)[]
  readonly loadsAre?: string
}

/** The piles in plan, to scale, with their loads and the outline of the block. */
export function layoutFigure(id: string, view: LayoutView): Markup {
  const { points, section, block, loads } = view
  const width = sectionWidth(section)
  const corners = block ? outline(points, width, block) : []
  const all = [...points, ...corners, { x: 0, y: 0 }]
  const [x0, x1, y0, y1] = [
    Math.min(...all.map((p) => p.x)) - width,
    Math.max(...all.map((p) => p.x)) + width,
    Math.min(...all.map((p) => p.y)) - width,
    Math.max(...all.map((p) => p.y)) + width,
  ]
  const scale = Math.min(430 / (x1 - x0), 300 / (y1 - y0), 130)
  const left = 64
  const x = scaleLinear([x0, x1], [left, left + (x1 - x0) * scale])
  const y = scaleLinear([y0, y1], [40 + (y1 - y0) * scale, 40])
  const size = width * scale
  const largest = Math.max(...(loads ?? []).map((l) => l ?? Number.NEGATIVE_INFINITY))
  const crowded = points.length > 1 && closest(points) * scale < 46
  const piles = points.map((p, i) => {
    const load = loads?.[i]
    const most = load !== undefined && load === largest
    const shape =
      section.shape === 'circular' || section.shape === 'tubular'
        ? html`<circle class="pile white" cx="${round(x(p.x))}" cy="${round(y(p.y))}" r="${round(size / 2)}"/><circle class="pile" fill="url(#${id}-pile)" cx="${round(x(p.x))}" cy="${round(y(p.y))}" r="${round(size / 2)}"/>`
        : html`<rect class="pile white" x="${round(x(p.x) - size / 2)}" y="${round(y(p.y) - size / 2)}" width="${round(size)}" height="${round(size)}"/><rect class="pile" fill="url(#${id}-pile)" x="${round(x(p.x) - size / 2)}" y="${round(y(p.y) - size / 2)}" width="${round(size)}" height="${round(size)}"/>`
    const ring =
      most && html`<circle class="most" cx="${round(x(p.x))}" cy="${round(y(p.y))}" r="${round(size * 0.72 + 3)}"/>`
    const label =
      load !== undefined &&
      (!crowded || most) &&
      html`<text class="label halo mid" x="${round(x(p.x))}" y="${round(y(p.y) + (most ? size * 0.72 + 15 : size / 2 + 13))}">${short(load)}</text>`
    return html`${shape}${ring}<text class="${size > 17 ? 'count mid halo' : 'count small mid halo'}" x="${round(x(p.x))}" y="${round(y(p.y) + 4)}">${i + 1}</text>${label}`
  })
  const path = corners.map((p, i) => `${i === 0 ? 'M' : 'L'}${round(x(p.x))} ${round(y(p.y))}`).join('')
  const bottom = y(y0) + 26
  const height = bottom + 34
  return figureOf(
    {
      id,
      width: Math.max(x(x1) + 90, 380),
      height,
      title: 'Piles in plan',
      description: `To scale, numbered in the order of the layout; the cross is the cap's origin.${block ? ' Chain line: outline of the block.' : ''}${
        loads?.some((l) => l !== undefined)
          ? ` Numbers beside the piles: ${view.loadsAre ?? 'load in kN'}; ring: the largest${crowded ? ', which alone is written where piles stand close' : ''}.`
          : ''
      }`,
    },
    html`${patterns(id)}${block && html`<path class="block" d="${path}Z"/>${sides(id, corners, x, y, block)}`}<path class="cross" d="M${round(x(0) - 9)} ${round(y(0))}h18M${round(x(0))} ${round(y(0) - 9)}v18"/>${joined(piles)}
${axes(x, y, x0, x1, y0, y1, bottom)}`,
  )
}

type Scale = (n: number) => number

/** Rulers along x and y; ticks are the places of the piles where there are few, else even steps. */
function axes(
  x: Scale & { ticks(n: number): number[] },
  y: Scale & { ticks(n: number): number[] },
  x0: number,
  x1: number,
  y0: number,
  y1: number,
  bottom: number,
): Markup {
  const along = x.ticks(5).filter((t) => t > x0 && t < x1)
  const up = y.ticks(5).filter((t) => t > y0 && t < y1)
  return html`<path class="axis" d="M${round(x(x0))} ${bottom}H${round(x(x1))}M${38} ${round(y(y0))}V${round(y(y1))}"/>${along.map((t) => html`<path class="axis" d="M${round(x(t))} ${bottom}v4"/><text class="tick mid" x="${round(x(t))}" y="${bottom + 16}">${short(t)}</text>`)}<text class="unit" x="${round(x(x1) + 6)}" y="${bottom + 4}">x, m</text>${up.map((t) => html`<path class="axis" d="M38 ${round(y(t))}h-4"/><text class="tick end" x="32" y="${round(y(t) + 4)}">${short(t)}</text>`)}<text class="unit" x="14" y="${round(y(y1) - 10)}">y, m</text>`
}

function sides(
  id: string,
  corners: readonly Point[],
  x: Scale,
  y: Scale,
  block: { breadth: number; length: number },
): Markup {
  const [a, b, c] = corners
  const first = Math.hypot(b!.x - a!.x, b!.y - a!.y)
  const second = Math.hypot(c!.x - b!.x, c!.y - b!.y)
  const isLength =
    Math.abs(first - block.length) + Math.abs(second - block.breadth) <=
    Math.abs(first - block.breadth) + Math.abs(second - block.length)
  const written = isLength
    ? [`L_g ${short(block.length)} m`, `B ${short(block.breadth)} m`]
    : [`B ${short(block.breadth)} m`, `L_g ${short(block.length)} m`]
  return html`${dimension(id, x(a!.x), y(a!.y), x(b!.x), y(b!.y), written[0]!)}${dimension(id, x(b!.x), y(b!.y), x(c!.x), y(c!.y), written[1]!)}`
}

/** A dimension line on the outer side of an edge that runs counter-clockwise in plan. */
function dimension(id: string, xa: number, ya: number, xb: number, yb: number, text: string): Markup {
  const length = Math.hypot(xb - xa, yb - ya) || 1
  const off = 12
  const [nx, ny] = [(-(yb - ya) / length) * off, ((xb - xa) / length) * off]
  const turn = (Math.atan2(yb - ya, xb - xa) * 180) / Math.PI
  const upright = turn > 90 || turn <= -90 ? turn + 180 : turn
  const side = upright === turn ? 1 : -1
  return html`<path class="dim" marker-start="url(#${id}-end)" marker-end="url(#${id}-end)" d="M${round(xa + nx)} ${round(ya + ny)}L${round(xb + nx)} ${round(yb + ny)}"/><text class="label halo mid" transform="translate(${round((xa + xb) / 2 + nx)} ${round((ya + yb) / 2 + ny)}) rotate(${round(upright)})" dy="${side > 0 ? 13 : -5}">${text.startsWith('L_g') ? html`L<tspan class="sub" dy="3">g</tspan><tspan dy="-3">${text.slice(3)}</tspan>` : text}</text>`
}

function outline(
  points: readonly Point[],
  width: number,
  { angle, breadth, length }: { angle: number; breadth: number; length: number },
): Point[] {
  const [c, s] = [Math.cos(angle), Math.sin(angle)]
  const along = points.map((p) => p.x * c + p.y * s)
  const across = points.map((p) => p.y * c - p.x * s)
  const [u0, u1, v0, v1] = [Math.min(...along), Math.max(...along), Math.min(...across), Math.max(...across)]
  const [mu, mv] = [(u0 + u1) / 2, (v0 + v1) / 2]
  const isLong = Math.abs(u1 - u0 + width - length) <= Math.abs(u1 - u0 + width - breadth)
  const [a, b] = isLong ? [length / 2, breadth / 2] : [breadth / 2, length / 2]
  const corner = (u: number, v: number) => ({ x: u * c - v * s, y: u * s + v * c })
  return [corner(mu - a, mv - b), corner(mu + a, mv - b), corner(mu + a, mv + b), corner(mu - a, mv + b)]
}

function closest(points: readonly Point[]): number {
  let least = Number.POSITIVE_INFINITY
  for (let i = 0; i < points.length; i++)
    for (let j = 0; j < i; j++)
      least = Math.min(least, Math.hypot(points[i]!.x - points[j]!.x, points[i]!.y - points[j]!.y))
  return least
}
