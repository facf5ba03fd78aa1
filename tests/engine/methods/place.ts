import { stratumAt } from '../../../src/engine/ground/depths.ts'
import type { GroundProfile, Layer } from '../../../src/engine/ground/profile-types.ts'
import type { BaseMethod, ShaftMethod } from '../../../src/engine/methods/method.ts'
import { baseMethods, shaftMethods } from '../../../src/engine/methods/registry.ts'
import type { Notice } from '../../../src/engine/notice.ts'
import type { Installation, Section } from '../../../src/engine/piles/pile-type.ts'
import { calculatorPlaces, type ResistanceJob } from '../../../src/engine/resistance/job.ts'
import { contextAt, site } from '../../../src/engine/resistance/site.ts'
import { Sheet } from '../../../src/engine/trace/sheet.ts'
import type { Step } from '../../../src/engine/trace/step.ts'
import type { Term } from '../../../src/engine/trace/term.ts'

export type Place = {
  /** One layer without end, or a whole profile. */
  readonly ground: Layer | GroundProfile
  readonly section?: Section
  readonly length?: number
  readonly installation?: Installation
  readonly direction?: 'compression' | 'uplift'
  /** Depth of the point on the shaft; a base stands at the toe. */
  readonly depth?: number
  /** Breadth and length of a base, for a block. */
  readonly breadth?: number
  readonly blockLength?: number
  readonly settings?: Readonly<Record<string, number>>
}
export type Met = {
  readonly value: number
  readonly steps: readonly Step[]
  readonly notices: readonly Notice[]
  /** Value of the step of this symbol; throws when there is none. */
  readonly step: (symbol: string) => number
}

/** The engine's own site and context on a recording sheet, and the method asked for there. */
function meet(place: Place, ask: (sheet: Sheet, job: ResistanceJob) => Term<'kPa'>): Met {
  const notices: Notice[] = []
  const sheet = Sheet.recording()
  const job: ResistanceJob = {
    pile: {
      section: place.section ?? { shape: 'circular', diameter: 1 },
      length: place.length ?? 10,
      installation: place.installation ?? 'driven',
    },
    ground: 'layers' in place.ground ? place.ground : { layers: [place.ground] },
    methods: {},
    direction: place.direction ?? 'compression',
    at: calculatorPlaces,
    notice: (n) => notices.push(n),
  }
  const { value } = ask(sheet, job)
  const step = (symbol: string) => {
    const found = sheet.steps.filter((s) => s.symbol === symbol)
    if (found.length === 0) throw new Error(`no step ${symbol}`)
    return found.at(-1)!.value
  }
  return { value, steps: sheet.steps, notices, step }
}

const metres = (sheet: Sheet, symbol: string, value: number) =>
  sheet.within('place').input({ symbol, name: symbol, unit: 'm' }, value, '/place', symbol)

export const onShaft = (role: keyof typeof shaftMethods, id: string, place: Place): Met =>
  meet(place, (sheet, job) => {
    const method = (shaftMethods[role] as Readonly<Record<string, ShaftMethod>>)[id]!
    const s = site(sheet, job)
    const depth = metres(sheet, 'z', place.depth ?? 5)
    const chosen = { method, settings: place.settings ?? {}, pointer: `/methods/${role}`, role }
    const extra = { diameter: s.section.width, toeDepth: s.toeDepth }
    return method.unitShaftResistance(
      contextAt(s, sheet.within('shaft'), stratumAt(s.layers, depth.value)!, depth, chosen, extra),
    )
  })

export const onBase = (role: keyof typeof baseMethods, id: string, place: Place): Met =>
  meet(place, (sheet, job) => {
    const method = (baseMethods[role] as Readonly<Record<string, BaseMethod>>)[id]!
    const s = site(sheet, job)
    const breadth = place.breadth === undefined ? s.section.baseWidth : metres(sheet, 'B', place.breadth)
    const length = place.blockLength === undefined ? breadth : metres(sheet, 'L_g', place.blockLength)
    const chosen = { method, settings: place.settings ?? {}, pointer: `/methods/${role}`, role }
    return method.unitBaseResistance(
      contextAt(s, sheet.within('base'), stratumAt(s.layers, s.toeDepth.value)!, s.toeDepth, chosen, {
        breadth,
        length,
      }),
    )
  })

export const clay = (undrainedShearStrength: number, more: object = {}): Layer => ({
  name: 'clay',
  soil: 'cohesive',
  unitWeight: 20,
  undrainedShearStrength,
  ...more,
})
export const sand = (more: object): Layer => ({ name: 'sand', soil: 'granular', unitWeight: 20, ...more })
