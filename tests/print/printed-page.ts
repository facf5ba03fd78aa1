import { type HTMLElement, parse } from 'node-html-parser'
import type { UnitCode } from '../../src/engine/quantities/units.ts'
import { units } from '../../src/engine/quantities/units.ts'
import { unitLabel } from '../../src/print/quantity.ts'

/** Reads a page as a checker does: from its text alone. */
export const read = (page: string): HTMLElement => parse(page, { blockTextElements: { style: false, script: false } })

/** A printed number: its value, half of its seventh figure, and one of its fourth. Fewer figures than seven are exact ones. */
export type Printed = { readonly value: number; readonly half: number; readonly unit: number }

export function printed(text: string): Printed {
  const match = /^\(?(−?)(\d+(?:\.\d*)?)(?: ?× ?10(−?\d+))?/.exec(text.trim())
  if (!match) throw new Error(`no number in "${text}"`)
  const power = match[3] === undefined ? 0 : Number(match[3].replace('−', '-'))
  const value = Number(`${match[2]}e${power}`) * (match[1] ? -1 : 1)
  const first = value === 0 ? 0 : Math.floor(Math.log10(Math.abs(value)))
  return { value, half: 0.5 * 10 ** (first - 6), unit: value === 0 ? 1e-12 : 10 ** (first - 3) }
}

/** The number in an element, without references and units. */
export function numberIn(element: HTMLElement): Printed {
  const copy = read(element.outerHTML)
  for (const part of copy.querySelectorAll('.ref, mtext')) part.remove()
  return printed(copy.text)
}

const codes = new Map((Object.keys(units) as UnitCode[]).map((code) => [unitLabel(code), code]))
/** A unit as printed: nothing for a ratio, in brackets over a column. */
export function unitOf(text: string): UnitCode {
  const label = text.trim().replace(/^\[(.*)\]$/, '$1')
  const code = codes.get(label)
  if (!code) throw new Error(`no unit in "${text}"`)
  return code
}

export type PrintedLine = {
  readonly id: string
  readonly formula: string
  readonly operands: readonly { readonly symbol: string; readonly number: Printed; readonly unit: UnitCode }[]
  readonly result: Printed
  readonly unit: UnitCode
}

/** Every line of a page that is a formula, whether it stands alone or in a table. */
export function formulaLines(page: HTMLElement): PrintedLine[] {
  return page.querySelectorAll('section.line').flatMap((block): PrintedLine[] => {
    const formula = block
      .querySelector('math.formula')
      ?.getAttribute('alttext')
      ?.replace(/^\S.*? = /, '')
    if (formula === undefined) return []
    if (!block.classList.contains('several')) {
      const put = block.querySelectorAll('mrow.in').map((e) => ({
        symbol: e.getAttribute('data-symbol')!,
        number: numberIn(e),
        unit: unitOf(e.querySelector('mtext')?.text ?? ''),
      }))
      const out = block.querySelector('mrow.out')!
      const operands = [...new Map(put.map((p) => [p.symbol, p])).values()]
      return [
        {
          id: block.getAttribute('data-step')!,
          formula,
          operands,
          result: numberIn(out),
          unit: unitOf(out.querySelector('mtext')?.text ?? ''),
        },
      ]
    }
    const fixed = block.querySelectorAll('.with .in').map((e) => ({
      symbol: e.getAttribute('data-symbol')!,
      number: numberIn(e),
      unit: unitOf(withoutNumber(e)),
    }))
    const heads = block.querySelectorAll('thead th.num')
    return block.querySelectorAll('tbody tr').map((row) => {
      const cells = row.querySelectorAll('td.in')
      const moving = cells.map((cell, i) => ({
        symbol: heads[i]!.getAttribute('data-symbol')!,
        number: numberIn(cell),
        unit: unitOf(heads[i]!.querySelector('.unit')?.text ?? ''),
      }))
      return {
        id: row.getAttribute('data-step')!,
        formula,
        operands: [...fixed, ...moving],
        result: numberIn(row.querySelector('td.out')!),
        unit: unitOf(heads.at(-1)!.querySelector('.unit')?.text ?? ''),
      }
    })
  })
}

function withoutNumber(element: HTMLElement): string {
  const copy = read(element.outerHTML)
  for (const part of copy.querySelectorAll('small, sup, .ref')) part.remove()
  return copy.text.replace(/^−?[\d.]+(?: × 10)?/, '')
}
