/** Pile positions under one cap, in m from the cap's origin. */
export type Point = { readonly x: number; readonly y: number }
export type Layout =
  | {
      readonly kind: 'grid'
      readonly columns: number
      readonly rows: number
      readonly spacing?: number
      readonly spacingX?: number
      readonly spacingY?: number
    }
  | { readonly kind: 'ring'; readonly count: number; readonly radius: number }
  | { readonly kind: 'points'; readonly points: readonly Point[] }

/** A cosine or sine of rounding only is that of a pile on an axis. */
const onAxis = (value: number): number => (Math.abs(value) < 1e-15 ? 0 : value)

/** Positions in the layout's order: a grid runs along x first and is centred; a ring starts on the +x axis and turns towards +y. */
export function positions(layout: Layout): readonly Point[] {
  if (layout.kind === 'points') return layout.points
  if (layout.kind === 'ring') {
    return Array.from({ length: layout.count }, (_, i) => {
      const angle = (2 * Math.PI * i) / layout.count
      return { x: layout.radius * onAxis(Math.cos(angle)), y: layout.radius * onAxis(Math.sin(angle)) }
    })
  }
  const { columns, rows } = layout
  const dx = layout.spacingX ?? layout.spacing ?? 0
  const dy = layout.spacingY ?? layout.spacing ?? 0
  return Array.from({ length: columns * rows }, (_, i) => ({
    x: ((i % columns) - (columns - 1) / 2) * dx,
    y: (Math.floor(i / columns) - (rows - 1) / 2) * dy,
  }))
}

/** Centroid of points, each counted once. */
export function centroidOf(points: readonly Point[]): Point {
  const n = points.length
  return { x: points.reduce((s, p) => s + p.x, 0) / n, y: points.reduce((s, p) => s + p.y, 0) / n }
}
