import { applyBasis } from './design-basis/design-resistance.ts'
import { type Notice, usualCautions } from './notice.ts'
import type { GroupRequest, SettlementRequest, SinglePileRequest } from './requests.ts'
import { type BlockTerms, block } from './resistance/block.ts'
import { group, sumOfPilesFormula } from './resistance/group.ts'
import { calculatorPlaces, type ResistanceJob } from './resistance/job.ts'
import { type PileTerms, singlePile } from './resistance/single-pile.ts'
import { settlement } from './settlement/settlement.ts'
import type { UltimateTerms } from './settlement/softening.ts'
import { type Plain, settleTerms, traceOf } from './trace/outcome.ts'
import { plainTexts } from './trace/plain-string.ts'
import { Sheet } from './trace/sheet.ts'
import type { Trace } from './trace/step.ts'
import type { Term } from './trace/term.ts'

export type Answer<R> = { readonly result: R; readonly notices: readonly Notice[]; readonly trace?: Trace }
export type TraceOption = { readonly trace: boolean }
type Safe = { readonly designResistance?: Term<'kN'>; readonly allowableLoad?: Term<'kN'> }

/** Runs a computation on a recording or silent sheet, and gathers its notices: each text once, the usual cautions first. */
function answer<T>(
  { trace }: TraceOption,
  compute: (sheet: Sheet, notice: (n: Notice) => void) => T,
): Answer<Plain<T>> {
  const sheet = trace ? Sheet.recording() : Sheet.silent
  const notices = new Map([[usualCautions.text, usualCautions]])
  const { result, links } = settleTerms(compute(sheet, (n) => notices.set(n.text + (n.pointer ?? ''), plainTexts(n))))
  return { result, notices: [...notices.values()], ...(trace && { trace: traceOf(sheet, links) }) }
}

const jobOf = (request: SinglePileRequest, notice: (n: Notice) => void): ResistanceJob => ({
  pile: request.pile,
  ground: request.ground,
  methods: request.methods ?? {},
  direction: request.direction ?? 'compression',
  designBasis: request.designBasis,
  at: calculatorPlaces,
  notice,
})

function safePile(sheet: Sheet, job: ResistanceJob, pile: PileTerms): Safe {
  if (!job.designBasis) return {}
  const { shaftResistance: shaft, baseResistance: base, ultimateResistance: ultimate, weight } = pile
  const part = job.direction === 'uplift' ? 'pile-uplift' : 'pile-compression'
  return applyBasis(
    sheet.within('design/pile'),
    job.designBasis,
    { part, shaft, base, ultimate, weight, installation: job.pile.installation },
    job.at.designBasis,
  )
}

function safeBlock(sheet: Sheet, job: ResistanceJob, prism: BlockTerms): Safe {
  if (!job.designBasis) return {}
  const { sideResistance: shaft, baseResistance: base, ultimateResistance: ultimate, weight } = prism
  const part = job.direction === 'uplift' ? 'block-uplift' : 'block-compression'
  return applyBasis(
    sheet.within('design/block'),
    job.designBasis,
    { part, shaft, base, ultimate, weight, installation: job.pile.installation },
    job.at.designBasis,
  )
}

export const calculateSinglePile = (request: SinglePileRequest, option: TraceOption) =>
  answer(option, (sheet, notice) => {
    const job = jobOf(request, notice)
    const pile = singlePile(sheet, job)
    return { ...pile, ...safePile(sheet, job, pile) }
  })

export const calculateBlock = (request: GroupRequest, option: TraceOption) =>
  answer(option, (sheet, notice) => {
    const job = { ...jobOf(request, notice), layout: request.layout }
    const prism = block(sheet, job)
    return { ...prism, ...safeBlock(sheet, job, prism) }
  })

export const calculateGroup = (request: GroupRequest, option: TraceOption) =>
  answer(option, (sheet, notice) => {
    const job = { ...jobOf(request, notice), layout: request.layout }
    const terms = group(sheet, job)
    const single = { ...terms.single, ...safePile(sheet, job, terms.single) }
    const prism = { ...terms.block, ...safeBlock(sheet, job, terms.block) }
    const smaller = (key: keyof Safe, symbol: string, name: string): Term<'kN'> | undefined => {
      const [one, whole] = [single[key], prism[key]]
      if (!one || !whole) return undefined
      const here = sheet.within('design/group')
      const all = here.step(sumOfPilesFormula, { n: terms.pileCount, R: one }, `${symbol}/piles`)
      return here.choice({ symbol, name, unit: 'kN' }, 'smallest', [all, whole])
    }
    return {
      ...terms,
      single,
      block: prism,
      designResistance: smaller('designResistance', 'R_d', 'design resistance of the group'),
      allowableLoad: smaller('allowableLoad', 'R_a', 'allowable load of the group'),
    }
  })

const settlementPlaces = { pile: '/pile', ground: '/ground', layout: '/layout', load: '/load' }

/** What the pile can carry at most, where its springs soften towards it. */
function ultimateOf(sheet: Sheet, request: SettlementRequest, notice: (n: Notice) => void): UltimateTerms | undefined {
  if (!request.nonlinearity) return undefined
  const { pile, ground, methods, load } = request
  const terms = singlePile(
    sheet.within('resistance'),
    jobOf({ pile, ground, methods, direction: load.V < 0 ? 'uplift' : 'compression' }, notice),
  )
  return { layers: terms.layers, shaft: terms.shaftResistance, base: terms.baseResistance }
}

export const calculateSettlement = (request: SettlementRequest, option: TraceOption) =>
  answer(option, (sheet, notice) =>
    settlement(sheet, request, settlementPlaces, notice, ultimateOf(sheet, request, notice)),
  )
