import { practice, statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { PileType, Section } from './pile-type.ts'

const d = { d: 'm' } as const
export const circlePerimeter = formula({
  symbol: 'U',
  name: 'shaft perimeter',
  unit: 'm',
  text: 'pi * d',
  where: d,
  source: statics('circle'),
})
export const squarePerimeter = formula({
  symbol: 'U',
  name: 'shaft perimeter',
  unit: 'm',
  text: '4 * d',
  where: d,
  source: statics('square'),
})
export const boxPerimeter = formula({
  symbol: 'U',
  name: 'perimeter of the enclosing box',
  unit: 'm',
  text: '2 * (h + b)',
  where: { h: 'm', b: 'm' },
  source: practice('H section: enclosing box'),
})
export const circleArea = formula({
  symbol: 'A',
  name: 'area of a circle',
  unit: 'm2',
  text: 'pi * d^2 / 4',
  where: d,
  source: statics('circle'),
})
export const squareArea = formula({
  symbol: 'A',
  name: 'area of a square',
  unit: 'm2',
  text: 'd^2',
  where: d,
  source: statics('square'),
})
export const boxArea = formula({
  symbol: 'A',
  name: 'area of the enclosing box',
  unit: 'm2',
  text: 'h * b',
  where: { h: 'm', b: 'm' },
  source: practice('H section: enclosing box'),
})
export const wallArea = formula({
  symbol: 'A_w',
  name: 'area of the tube wall',
  unit: 'm2',
  text: 'pi * (d - t) * t',
  where: { d: 'm', t: 'm' },
  source: statics('annulus'),
})

export type SectionTerms = {
  /** Diameter or width; of an H section the larger side of its enclosing box. */
  readonly width: Term<'m'>
  readonly perimeter: Term<'m'>
  /** Area that the base bears on: the enlarged base where there is one. */
  readonly baseArea: Term<'m2'>
  readonly baseWidth: Term<'m'>
  /** Whole area within the outline of the shaft. */
  readonly outline: Term<'m2'>
  /** Area of material, for weight and axial stiffness. */
  readonly material: Term<'m2'>
  readonly wall?: { readonly area: Term<'m2'>; readonly thickness: Term<'m'> }
}

/** Width of a section in m without a trace: diameter, width, or the larger side of the box. */
export function sectionWidth(section: Section): number {
  if (section.shape === 'square') return section.width
  return section.shape === 'h' ? Math.max(section.depth, section.flangeWidth) : section.diameter
}

export const isSteel = (section: Section): boolean => section.shape === 'tubular' || section.shape === 'h'

/** Perimeter, areas and widths of a pile type, as steps under `pile/`. `pointer` is the pile type's place in the request. */
export function sectionTerms(root: Sheet, pile: PileType, pointer: string): SectionTerms {
  const sheet = root.within('pile')
  const { section } = pile
  const at = `${pointer}/section`
  const own = shaftTerms(sheet, section, at)
  if (pile.baseDiameter === undefined) return { ...own, baseArea: own.outline, baseWidth: own.width }
  const baseWidth = sheet.input(
    { symbol: 'd_b', name: 'diameter of the enlarged base', unit: 'm' },
    pile.baseDiameter,
    `${pointer}/baseDiameter`,
  )
  return { ...own, baseWidth, baseArea: sheet.step(circleArea, { d: baseWidth }, 'A_b') }
}

function shaftTerms(
  sheet: Sheet,
  section: Section,
  at: string,
): Omit<SectionTerms, 'baseArea' | 'baseWidth'> & { outline: Term<'m2'> } {
  if (section.shape === 'h') {
    const h = sheet.input({ symbol: 'h', name: 'section depth', unit: 'm' }, section.depth, `${at}/depth`)
    const b = sheet.input({ symbol: 'b', name: 'flange width', unit: 'm' }, section.flangeWidth, `${at}/flangeWidth`)
    const width = sheet.choice({ symbol: 'd', name: 'width of the enclosing box', unit: 'm' }, 'largest', [h, b])
    const material = sheet.input({ symbol: 'A_s', name: 'steel area', unit: 'm2' }, section.area, `${at}/area`)
    return { width, perimeter: sheet.step(boxPerimeter, { h, b }), outline: sheet.step(boxArea, { h, b }), material }
  }
  if (section.shape === 'square') {
    const width = sheet.input({ symbol: 'd', name: 'pile width', unit: 'm' }, section.width, `${at}/width`)
    const area = sheet.step(squareArea, { d: width })
    return { width, perimeter: sheet.step(squarePerimeter, { d: width }), outline: area, material: area }
  }
  const width = sheet.input({ symbol: 'd', name: 'pile diameter', unit: 'm' }, section.diameter, `${at}/diameter`)
  const perimeter = sheet.step(circlePerimeter, { d: width })
  const area = sheet.step(circleArea, { d: width })
  if (section.shape === 'circular') return { width, perimeter, outline: area, material: area }
  const thickness = sheet.input(
    { symbol: 't', name: 'wall thickness', unit: 'm' },
    section.wallThickness,
    `${at}/wallThickness`,
  )
  const wall = { area: sheet.step(wallArea, { d: width, t: thickness }), thickness }
  return { width, perimeter, outline: area, material: wall.area, wall }
}
