import { applyBasis } from '../design-basis/design-resistance.ts'
import type { Notice } from '../notice.ts'
import { type Point, positions } from '../piles/layout.ts'
import { type PilePlan, pilePlan } from '../piles/pile-plan.ts'
import { type RigidCap, rigidCap } from '../piles/rigid-cap.ts'
import type { BlockTerms } from '../resistance/block.ts'
import { group, sumOfPilesFormula } from '../resistance/group.ts'
import type { GroupJob } from '../resistance/job.ts'
import type { PileTerms } from '../resistance/single-pile.ts'
import { capStiffness } from '../settlement/cap-stiffness.ts'
import { pilePlaces } from '../settlement/pile-places.ts'
import { type PreparedGroup, prepareGroup } from '../settlement/prepared-group.ts'
import { plainTexts } from '../trace/plain-string.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { escapePointer } from './places.ts'
import type { Cap, Schedule } from './schedule.ts'

/** Resistances that a combination is checked against, after the design basis. */
export type Safe = { readonly pile: Term<'kN'>; readonly piles: Term<'kN'>; readonly block: Term<'kN'> }

/** What one pile type in one ground under one layout resists and how it moves: computed once, used by every cap and combination. */
export type ResistanceSet = {
  readonly points: readonly Point[]
  readonly pileCount: Term<'1'>
  readonly single: PileTerms
  readonly block: BlockTerms
  readonly compression: Safe
  /** Computed when the first cap is pulled. */
  readonly uplift: () => Safe
  readonly statics: RigidCap
  readonly plan: PilePlan
  readonly prepared: PreparedGroup
  readonly stiffness: ReturnType<typeof capStiffness>
  readonly notices: () => readonly Notice[]
}

export function resistanceSet(root: Sheet, schedule: Schedule, cap: Cap, index: number, id: number): ResistanceSet {
  const sheet = root.within(`resistance/${id}`)
  const notices = new Map<string, Notice>()
  const notice = (n: Notice) => notices.set(n.text + (n.pointer ?? ''), plainTexts(n))
  const pile = schedule.pileTypes[cap.pileType]!
  const ground = schedule.ground[cap.ground]!
  const at = {
    pile: `/pileTypes/${escapePointer(cap.pileType)}`,
    ground: `/ground/${escapePointer(cap.ground)}`,
    layout: `/caps/${index}/layout`,
    methods: '/methods',
    designBasis: '/designBasis',
  }
  const basis = schedule.designBasis
  const job = (direction: 'compression' | 'uplift'): GroupJob => ({
    pile,
    ground,
    methods: schedule.methods ?? {},
    direction,
    designBasis: basis,
    layout: cap.layout,
    at,
    notice,
  })
  const safe = (here: Sheet, direction: 'compression' | 'uplift') => {
    const terms = group(here, job(direction))
    const { single, block } = terms
    const part = (
      kind: 'pile' | 'block',
      shaft: Term<'kN'>,
      base: Term<'kN'>,
      ultimate: Term<'kN'>,
      weight: Term<'kN'> | undefined,
    ): Term<'kN'> => {
      const s = applyBasis(
        here.within(`design/${kind}`),
        basis,
        { part: `${kind}-${direction}`, shaft, base, ultimate, weight, installation: pile.installation },
        at.designBasis,
      )
      return (s.designResistance ?? s.allowableLoad)!
    }
    const one = part('pile', single.shaftResistance, single.baseResistance, single.ultimateResistance, single.weight)
    const whole = part('block', block.sideResistance, block.baseResistance, block.ultimateResistance, block.weight)
    const piles = here.within('design').step(sumOfPilesFormula, { n: terms.pileCount, R: one }, 'sum')
    return { terms, safe: { pile: one, piles, block: whole } }
  }
  const compression = safe(sheet, 'compression')
  let uplift: Safe | undefined
  const points = positions(cap.layout)
  const inPlan = sheet.within('plan')
  const prepared = prepareGroup(
    sheet.within('settlement'),
    pile,
    ground,
    cap.layout,
    { ...at, load: '/loads' },
    schedule.settlementMethod,
    notice,
  )
  return {
    points,
    pileCount: compression.terms.pileCount,
    single: compression.terms.single,
    block: compression.terms.block,
    compression: compression.safe,
    uplift: () => {
      uplift ??= safe(sheet.within('uplift'), 'uplift').safe
      return uplift
    },
    statics: rigidCap(points),
    plan: pilePlan(inPlan, pilePlaces(inPlan, cap.layout, at.layout), compression.terms.pileCount),
    prepared,
    stiffness: capStiffness(sheet.within('settlement'), prepared),
    notices: () => [...notices.values()],
  }
}
