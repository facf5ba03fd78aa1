import { type Layout, positions } from '../piles/layout.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'

export type PilePlace = { readonly x: Term<'m'>; readonly y: Term<'m'> }

/** Pile positions from the cap's origin, as given or as the grid or ring lays them out. */
export function pilePlaces(sheet: Sheet, layout: Layout, pointer: string): readonly PilePlace[] {
  const given = (axis: 'x' | 'y', i: number, value: number) =>
    sheet.input(
      { symbol: axis, name: `${axis} of pile ${i + 1}`, unit: 'm' },
      value,
      layout.kind === 'points' ? `${pointer}/points/${i}/${axis}` : pointer,
      `piles/${i}/${axis}`,
    )
  return positions(layout).map((p, i) => ({ x: given('x', i, p.x), y: given('y', i, p.y) }))
}
