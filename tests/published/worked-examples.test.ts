import { afterAll, beforeAll, expect, test } from 'vitest'
import type { z } from 'zod'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import type { blockResult, settlementResult, singlePileResult } from '../../src/contract/replies.ts'
import { actionFactors, resistanceFactors } from '../../src/engine/design-basis/en-1997-1-2004.ts'
import { skemptonNc } from '../../src/engine/methods/cohesive-base/bearing.ts'
import { evaluated } from '../engine/trace/evaluated.ts'
import { compareFigures, type Figures, idleRemarks, readExamples } from './worked-example.ts'

let app: Awaited<ReturnType<typeof buildApp>>
beforeAll(async () => {
  app = await buildApp(readConfig({ LOG_LEVEL: 'silent' }))
})
afterAll(() => app.close())

type Pile = z.infer<typeof singlePileResult>
type Body = Readonly<Record<string, unknown>>

async function post<R>(route: string, payload: Body): Promise<R> {
  const reply = await app.inject({ method: 'POST', url: `/v1/${route}`, payload })
  expect(reply.statusCode, reply.body.slice(0, 400)).toBe(200)
  return reply.json() as R
}
const ask = async <R>(route: string, payload: Body) =>
  (await post<{ result: R }>(`${route}?trace=none`, payload)).result
const askPile = (payload: Body) => ask<Pile>('single-pile', payload)

const clay = (undrainedShearStrength: number | string | object, thickness?: number) => ({
  name: 'clay',
  soil: 'cohesive',
  unitWeight: 20,
  undrainedShearStrength,
  ...(thickness !== undefined && { thickness }),
})
const sand = (more: object) => ({ name: 'sand', soil: 'granular', unitWeight: 20, ...more })
const circle = (diameter: number | string) => ({ shape: 'circular', diameter })
const given = (alpha: number, bearingFactor: number) => ({
  cohesiveShaft: { method: 'specified-alpha', alpha },
  cohesiveBase: { method: 'specified-nc', bearingFactor },
})
const custom = (shaft: number, base = shaft) => ({ format: 'custom', shaft, base, block: 1, uplift: 1 })

/** Four piles whose outer faces enclose a rectangle of these sides. */
const corners = (x: number, y: number, d: number) => ({
  kind: 'grid',
  columns: 2,
  rows: 2,
  spacingX: x - d,
  spacingY: y - d,
})
const askBlock = (sides: { B: number; L: number; D: number }, side: number, base: number) =>
  ask<z.infer<typeof blockResult>>('block', {
    pile: { section: circle(0.4), length: sides.D, installation: 'driven' },
    ground: { layers: [clay(side, sides.D), clay(base)] },
    layout: corners(sides.L, sides.B, 0.4),
  })

const each = <T, R>(list: readonly T[], run: (item: T, i: number) => Promise<R>): Promise<R[]> =>
  Promise.all(list.map(run))

/** A check reads the inputs of its example and gives figures in the shape of `expected`. */
type Check = (inputs: unknown) => Promise<Figures>
const check = <I>(run: (inputs: I) => Promise<Figures>): Check => run as Check

const checks: Readonly<Record<string, Check>> = {
  'CRAIG-UNDERREAM': check(async (i: Record<string, number>) => {
    const idle = i.top_of_underream_m! - 2 * i.shaft_d_m!
    const pile = {
      section: circle(i.shaft_d_m!),
      baseDiameter: i.base_d_m,
      headDepth: i.pile_top_m,
      length: i.pile_toe_m! - i.pile_top_m!,
      installation: 'bored',
    }
    const layers = [clay(i.cu_shaft_avg_kPa!, idle), clay(0, i.pile_toe_m! - idle), clay(i.cu_base_kPa!)]
    const request = { pile, ground: { layers }, methods: given(i.alpha!, i.Nc!) }
    const overall = { format: 'overall-factor', factor: 2 }
    const whole = await askPile({ ...request, designBasis: overall })
    const split = await askPile({ ...request, designBasis: { ...overall, split: { shaft: 1, base: 3 } } })
    return {
      shaft_length_m: whole.layers[0]!.bottom - whole.layers[0]!.top,
      Qs_kN: whole.shaftResistance,
      Qb_kN: whole.baseResistance,
      Qu_kN: whole.ultimateResistance,
      allow_FS2_overall_kN: whole.allowableLoad!,
      allow_FS3_base_FS1_shaft_kN: split.allowableLoad!,
    }
  }),

  'KOLK-VDV': check(async (i: { psi: number[]; L_over_d: number[] }) => ({
    alpha: await each(i.psi, async (psi, n) => {
      const L = i.L_over_d[n]!
      const { trace } = await post<{ trace: { steps: { symbol: string; value: number }[] } }>('single-pile', {
        pile: { section: circle(1), length: L, installation: 'driven' },
        ground: { layers: [clay({ top: 0, bottom: psi * 20 * L }, L)] },
        methods: { cohesiveShaft: 'kolk-van-der-velde-1996', sublayer: 0.05 },
      })
      const alphas = trace.steps.filter((s) => s.symbol === 'alpha').map((s) => s.value)
      expect(alphas).toHaveLength(20 * L)
      const mean = alphas.reduce((sum, alpha) => sum + alpha, 0) / alphas.length
      // Integral of min(1, A x^-0.2) over the distance x from the toe in diameters: it is 1 as far as A^5.
      const A = 0.9 * psi ** -0.3
      const cut = Math.min(L, A ** 5)
      const exact = (cut + (A / 0.8) * (L ** 0.8 - cut ** 0.8)) / L
      expect(Math.abs(mean / exact - 1), `mean ${mean} against ${exact}`).toBeLessThan(0.001)
      return mean
    }),
  })),

  'SKEMPTON-NC': check(async (i: { D_over_B: number[]; B_over_L: number[] }) => ({
    Nc: await each(i.D_over_B, async (ratio, n) => {
      const shape = i.B_over_L[n]!
      if (ratio === 0 || shape === 0)
        return evaluated(skemptonNc, { D: ratio, B: 1, L_g: shape === 0 ? 1e12 : 1 / shape })
      const block = await askBlock({ B: 4, L: 4 / shape, D: 4 * ratio }, 50, 80)
      return block.baseResistance / block.baseArea / 80
    }),
  })),

  'DAS-SHAFT-CLAY-04': check(
    async (i: { d_m: number; layers: { L_m: number; cu_kPa: number }[]; alpha: number; Nc: number; FS: number }) => {
      const pile = await askPile({
        pile: { section: circle(i.d_m), length: i.layers.reduce((sum, l) => sum + l.L_m, 0), installation: 'bored' },
        ground: { layers: i.layers.map((l) => clay(l.cu_kPa, l.L_m)) },
        methods: given(i.alpha, i.Nc),
        designBasis: { format: 'overall-factor', factor: i.FS },
      })
      return { Qb_net_kN: pile.baseResistance, Qs_kN: pile.shaftResistance, Qallow_kN: pile.allowableLoad! }
    },
  ),

  'OR-QB-SPT': check(async (i: { N60: number[] }) => ({
    qb_kPa: await each(i.N60, async (sptN60) => {
      const pile = { section: circle(1), length: 10, installation: 'bored' }
      const methods = { granularShaft: 'oneill-reese-1999', granularBase: 'oneill-reese-1999' }
      return (await askPile({ pile, ground: { layers: [sand({ sptN60 })] }, methods })).unitBaseResistance
    }),
  })),

  'API-2GEO-BETA': check(async (i: { class: string[] }) => {
    /** Relative density in percent and silt of the soils that share a class. */
    const soils: Readonly<Record<string, [density: number, silty: number][]>> = {
      'medium dense sand-silt': [[50, 1]],
      'medium dense sand or dense sand-silt': [
        [50, 0],
        [75, 1],
      ],
      'dense sand or very dense sand-silt': [
        [75, 0],
        [90, 1],
      ],
      'very dense sand': [[90, 0]],
    }
    const at = async (length: number, [relativeDensity, silty]: [number, number]) => {
      const method = { method: 'rp2geo-2011', silty }
      const pile = await askPile({
        pile: {
          section: { shape: 'tubular', diameter: 1, wallThickness: 0.03, toe: 'closed' },
          length,
          installation: 'driven',
        },
        ground: { layers: [sand({ relativeDensity })] },
        // One sublayer: the shaft is read at half the length, where the stress is 10 kPa a metre of pile.
        methods: { granularShaft: method, granularBase: method, sublayer: 100 },
      })
      return { f: pile.layers[0]!.unitShaftResistance, q: pile.unitBaseResistance }
    }
    const rows = await each(i.class, async (name) => {
      const met = await each(soils[name]!, async (soil) => {
        const [short, long] = [await at(10, soil), await at(100, soil)]
        return [short.f / 100, long.f, short.q / 200, long.q / 1000].map((figure) => Number(figure.toPrecision(9)))
      })
      for (const other of met) expect(other).toEqual(met[0])
      return met[0]!
    })
    const column = (n: number) => rows.map((row) => row[n]!)
    return { beta: column(0), f_limit_kPa: column(1), Nq: column(2), q_limit_MPa: column(3) }
  }),

  'NAVFAC-NQ': check(async (i: { phi_deg: number[] }) => {
    const factors = (installation: string) =>
      each(i.phi_deg, async (frictionAngle) => {
        const pile = { section: circle(1), length: 10, installation }
        const ground = { layers: [sand({ frictionAngle })] }
        return (await askPile({ pile, ground, methods: { granularBase: 'navfac-1986' } })).unitBaseResistance / 200
      })
    return { Nq_driven: await factors('driven'), Nq_drilled: await factors('bored') }
  }),

  'AASHTO-BLOCK': check(async (i: { cases: Record<string, number>[] }) => {
    const blocks = await each(i.cases, (c) =>
      askBlock({ B: c.X_m!, L: c.Y_m!, D: c.Z_m! }, c.su_side_kPa!, c.su_base_kPa!),
    )
    return {
      Nc: blocks.map((b, n) => b.baseResistance / b.baseArea / i.cases[n]!.su_base_kPa!),
      Qg_kN: blocks.map((b) => b.ultimateResistance),
    }
  }),

  'MURTHY-15-23': check(async (i: Record<string, number>) => {
    const pile = await askPile({
      direction: 'uplift',
      pile: { section: circle(`${i.d_in} in`), length: `${i.L_ft} ft`, installation: 'bored', unitWeight: 1e-9 },
      ground: { layers: [clay(`${i.cu_psf} psf`)] },
      methods: { cohesiveShaft: { method: 'specified-alpha', alpha: i.alpha } },
      designBasis: { format: 'overall-factor', factor: 2, upliftFactor: i.FS },
    })
    const KIP = 4.4482216152605
    return {
      As_ft2: pile.shaftResistance / pile.layers[0]!.unitShaftResistance / 0.3048 ** 2,
      P_net_kips: pile.ultimateResistance / KIP,
      P_allow_kips: pile.allowableLoad! / KIP,
    }
  }),

  'RW-RIGID': check(async (i: { L_over_d: number[]; nu: number }) => ({
    stiffness_number: await each(i.L_over_d, async (length) => {
      const soil = { name: 'ground', soil: 'cohesive', unitWeight: 20, youngsModulus: 1, poissonsRatio: i.nu }
      const { single } = await ask<z.infer<typeof settlementResult>>('settlement', {
        pile: { section: circle(1), length, installation: 'bored', youngsModulus: 1e9 },
        ground: { layers: [soil] },
        load: { V: 1 },
        method: 'randolph-wroth-1978',
      })
      return single.stiffness / ((1 / (2 * (1 + i.nu))) * 0.5)
    }),
  })),

  'CAP-IXY': check(async (i: { xy_m: [number, number][]; V_kN: number; at_m: [number, number] }) => {
    const { group } = await ask<z.infer<typeof settlementResult>>('settlement', {
      pile: { section: circle(0.3), length: 10, installation: 'driven' },
      ground: { layers: [{ ...clay(50), youngsModulus: 20e3 }] },
      layout: { kind: 'points', points: i.xy_m.map(([x, y]) => ({ x, y })) },
      load: { V: i.V_kN, My: i.V_kN * i.at_m[0], Mx: i.V_kN * i.at_m[1] },
      cap: 'flexible',
    })
    return { P_kN: group!.piles.map((p) => p.load) }
  }),

  'EN-A3-A4': check(async () => {
    const actions = ({
      permanent,
      favourable,
      variable,
    }: {
      permanent: number
      favourable: number
      variable: number
    }) => ({ G_unfav: permanent, G_fav: favourable, Q_unfav: variable })
    const ground = async (approach: string) => {
      const factor = async (layer: object, methods: object) => {
        const request = {
          pile: { section: circle(0.5), length: 10, installation: 'driven' },
          ground: { layers: [layer] },
          methods,
        }
        const characteristic = { route: 'model-factor', value: 1 }
        const designBasis = { format: 'en1997-1-2004', approach, characteristic }
        const [plain, factored] = await each([request, { ...request, designBasis }], askPile)
        return plain!.shaftResistance / factored!.shaftResistance
      }
      const friction = { method: 'beta-effective-stress', earthPressure: 1, interfaceRatio: 1 }
      return {
        cu: await factor(clay(100), given(0.5, 9)),
        tan_phi: await factor(sand({ frictionAngle: 36 }), { granularShaft: friction }),
        gamma: await factor(sand({ frictionAngle: 36 }), { granularShaft: { method: 'specified-beta', beta: 0.4 } }),
      }
    }
    return {
      A1: actions(actionFactors.A1),
      A2: actions(actionFactors.A2),
      M1: await ground('DA1-1'),
      M2: await ground('DA3'),
    }
  }),

  'SMITH-DA12': check(
    async (i: {
      d_m: number
      L_m: number
      alpha: number
      Nc: number
      boreholes_cu_base_shaft_kPa: [number, number][]
      Gk_kN: number
      Qk_kN: number
      xi3: number
      xi4: number
      R4_base_shaft: [number, number]
    }) => {
      const design = async ([base, shaft]: readonly [number, number], xi: number) => {
        const pile = await askPile({
          pile: { section: circle(i.d_m), length: i.L_m, installation: 'bored' },
          ground: { layers: [clay(shaft, i.L_m), clay(base)] },
          methods: given(i.alpha, i.Nc),
          designBasis: custom(1 / (xi * i.R4_base_shaft[1]), 1 / (xi * i.R4_base_shaft[0])),
        })
        return pile.designResistance!
      }
      const holes = i.boreholes_cu_base_shaft_kPa
      const mean = (part: 0 | 1) => holes.reduce((sum, hole) => sum + hole[part], 0) / holes.length
      const byMean = await design([mean(0), mean(1)], i.xi3)
      const byLowest = Math.min(...(await each(holes, (hole) => design(hole, i.xi4))))
      const Rcd_kN = Math.min(byMean, byLowest)
      const Fcd_kN = actionFactors.A2.permanent * i.Gk_kN + actionFactors.A2.variable * i.Qk_kN
      return { Rcd_kN, Fcd_kN, ODF: Rcd_kN / Fcd_kN }
    },
  ),

  'TOM-43-EC7': check(async (i: Record<string, number>) => {
    const at = (cu: number, factor: number) =>
      askPile({
        pile: {
          section: circle(i.d_m!),
          baseDiameter: Math.sqrt((4 * i.Ab_m2!) / Math.PI),
          length: i.L_m,
          installation: 'bored',
        },
        ground: { layers: [clay(i.cu_shaft_kPa!, i.L_m), clay(cu)] },
        methods: given(i.alpha!, i.Nc!),
        designBasis: custom(factor),
      })
    const stiff = (factor: number) => at(i.cu_base_min_kPa!, i.stiffness_factor! / factor)
    const mean = await at(i.cu_base_mean_kPa!, 1)
    const lowest = await stiff(1)
    const approach = async (set: 'A1' | 'A2', gamma: number) => ({
      Fd_kN: actionFactors[set].permanent * i.Gk_kN! + actionFactors[set].variable * i.Qk_kN!,
      Rcd_kN: (await stiff(gamma)).designResistance!,
    })
    expect(resistanceFactors.R1.bored.total).toBe(i.gamma_t_R1)
    return {
      Rb_mean_kN: mean.baseResistance,
      Rs_kN: mean.shaftResistance,
      R_mean_kN: mean.ultimateResistance,
      R_min_kN: lowest.ultimateResistance,
      R_design_char_kN: lowest.designResistance!,
      DA1_1: await approach('A1', resistanceFactors.R1.bored.total),
      DA1_2: await approach('A2', i.gamma_t_R4_used!),
    }
  }),

  'BH-DRIVING': check(async (i: { DA2: { Rk_kN: number } }) => {
    // 10 m of shaft at half, and nine times on the base, of a strength that makes up the resistance.
    const c_u = i.DA2.Rk_kN / (Math.PI * 0.5 * 10 * 0.5 + 9 * Math.PI * 0.25 ** 2)
    const pile = await askPile({
      pile: { section: circle(0.5), length: 10, installation: 'driven' },
      ground: { layers: [clay(c_u)] },
      methods: given(0.5, 9),
      designBasis: { format: 'en1997-1-2004', approach: 'DA2', characteristic: { route: 'model-factor', value: 1 } },
    })
    expect(pile.ultimateResistance).toBeCloseTo(i.DA2.Rk_kN, 8)
    return { DA2_Rcd_kN: pile.designResistance! }
  }),
}

const entries = readExamples()
const covered = entries.filter((entry) => 'expected' in entry)
const leftOut = entries.filter((entry) => 'leftOut' in entry)

test('every entry of the collection is checked or left out for a reason', () => {
  expect(entries).toHaveLength(54)
  expect(new Set(entries.map((entry) => entry.id)).size).toBe(54)
  expect(covered.length + leftOut.length).toBe(54)
  expect(leftOut.filter((entry) => entry.leftOut.length < 10)).toEqual([])
  expect(Object.keys(checks).sort()).toEqual(covered.map((entry) => entry.id).sort())
  expect(covered.flatMap(idleRemarks)).toEqual([])
})

test.each(covered.map((example) => [example.id, example] as const))('%s', async (id, example) => {
  compareFigures(example, await checks[id]!(example.inputs))
})
