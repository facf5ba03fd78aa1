import { positions } from '../piles/layout.ts'
import { practice } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { type BlockTerms, blockOn } from './block.ts'
import type { GroupJob } from './job.ts'
import { type PileTerms, pileOn } from './single-pile.ts'
import { site } from './site.ts'

export const sumOfPilesFormula = formula({
  symbol: 'R_n',
  name: 'sum of the single piles',
  unit: 'kN',
  text: 'n * R',
  where: { n: '1', R: 'kN' },
  source: practice('sum of equal piles'),
})
export const efficiencyFormula = formula({
  symbol: 'eta',
  name: 'group efficiency',
  unit: '1',
  text: 'R_g / R_n',
  where: { R_g: 'kN', R_n: 'kN' },
  source: practice('the smaller of sum and block over the sum'),
})

export type GroupTerms = {
  readonly pileCount: Term<'1'>
  readonly single: PileTerms
  readonly sumOfPiles: Term<'kN'>
  readonly efficiency: Term<'1'>
  readonly block: BlockTerms
  readonly governing: 'piles' | 'block'
  readonly ultimateResistance: Term<'kN'>
}

/** Sum of single piles against block: the smaller governs. */
export function group(sheet: Sheet, job: GroupJob): GroupTerms {
  const s = site(sheet, job)
  const single = pileOn(s)
  const block = blockOn(s, job)
  const here = sheet.within('group')
  const pileCount = here.input(
    { symbol: 'n', name: 'number of piles in the layout', unit: '1' },
    positions(job.layout).length,
    job.at.layout,
  )
  const sumOfPiles = here.step(sumOfPilesFormula, { n: pileCount, R: single.ultimateResistance })
  const ultimateResistance = here.choice({ symbol: 'R_g', name: 'resistance of the group', unit: 'kN' }, 'smallest', [
    sumOfPiles,
    block.ultimateResistance,
  ])
  return {
    pileCount,
    single,
    sumOfPiles,
    block,
    ultimateResistance,
    efficiency: here.step(efficiencyFormula, { R_g: ultimateResistance, R_n: sumOfPiles }),
    governing: block.ultimateResistance.value < sumOfPiles.value ? 'block' : 'piles',
  }
}
