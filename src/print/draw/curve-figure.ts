import { scaleLinear, scaleLog } from 'd3-scale'
import { line } from 'd3-shape'
import { short } from '../figure.ts'
import { html, joined, type Markup } from '../markup.ts'
import { figureOf, round } from './frame.ts'

export type Place = { readonly x: number; readonly y: number }
export type CurveView = {
  readonly title: string
  readonly description: string
  /** `log`: from the first to the last power of ten that the points reach; for what changes over decades. */
  readonly x: { readonly title: string; readonly unit: string; readonly log?: boolean }
  readonly y: { readonly title: string; readonly unit: string; readonly downward?: boolean }
  readonly curve: readonly Place[]
  /** Single points with a name, such as the combinations under an interaction curve. */
  readonly marks?: readonly (Place & { readonly name: string })[]
  readonly closed?: boolean
}

const [WIDTH, HEIGHT, LEFT, TOP] = [460, 300, 70, 36]

/** A curve through given points, which are drawn too: nothing stands between them but straight lines. */
export function curveFigure(id: string, view: CurveView): Markup {
  const all = [...view.curve, ...(view.marks ?? [])]
  const span = (of: (p: Place) => number): [number, number] => [
    Math.min(0, ...all.map(of)),
    Math.max(0, ...all.map(of)) || 1,
  ]
  const along: [number, number] = [LEFT, LEFT + WIDTH]
  const xs = all.map((p) => p.x)
  const x = view.x.log
    ? scaleLog([Math.min(...xs), Math.max(...xs)], along).nice()
    : scaleLinear(
        span((p) => p.x),
        along,
      ).nice(6)
  const y = scaleLinear(
    span((p) => p.y),
    view.y.downward ? [TOP, TOP + HEIGHT] : [TOP + HEIGHT, TOP],
  ).nice(6)
  const path =
    line<Place>(
      (p) => round(x(p.x)),
      (p) => round(y(p.y)),
    )(view.curve) ?? ''
  const base = view.y.downward ? TOP : TOP + HEIGHT
  const xTicks = (view.x.log ? x.ticks().filter(isDecade) : x.ticks(6)).map(
    (t) =>
      html`<path class="grid" d="M${round(x(t))} ${TOP}v${HEIGHT}"/><text class="tick mid" x="${round(x(t))}" y="${view.y.downward ? TOP - 7 : base + 16}">${short(t)}</text>`,
  )
  const yTicks = y
    .ticks(6)
    .map(
      (t) =>
        html`<path class="grid" d="M${LEFT} ${round(y(t))}h${WIDTH}"/><text class="tick end" x="${LEFT - 6}" y="${round(y(t) + 4)}">${short(t)}</text>`,
    )
  const dots = view.curve.map((p) => html`<circle class="knot" cx="${round(x(p.x))}" cy="${round(y(p.y))}" r="2.2"/>`)
  const marks = (view.marks ?? []).map(
    (p) =>
      html`<path class="mark" d="M${round(x(p.x) - 5)} ${round(y(p.y))}h10M${round(x(p.x))} ${round(y(p.y) - 5)}v10"/><text class="label halo" x="${round(x(p.x) + 7)}" y="${round(y(p.y) - 5)}">${p.name}</text>`,
  )
  return figureOf(
    { id, width: LEFT + WIDTH + 70, height: TOP + HEIGHT + 34, title: view.title, description: view.description },
    html`${joined(xTicks)}${joined(yTicks)}<path class="axis" d="M${LEFT} ${base}h${WIDTH}M${LEFT} ${TOP}v${HEIGHT}"/><path class="profile" d="${path}${view.closed ? 'Z' : ''}"/>${joined(dots)}${joined(marks)}<text class="unit" x="${LEFT + WIDTH + 8}" y="${base + 4}">${view.x.title}, ${view.x.unit}</text><text class="unit" x="8" y="${TOP - 20}">${view.y.title}, ${view.y.unit}</text>`,
  )
}

/** 1, 2 and 5 of each decade are written. */
const isDecade = (t: number): boolean => [1, 2, 5].includes(Math.round(t / 10 ** Math.floor(Math.log10(t) + 1e-9)))
