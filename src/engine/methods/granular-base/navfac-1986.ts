import { cite, practice } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import { heldDepth, heldStress } from '../granular-shaft/navfac-1986.ts'
import type { BaseMethod } from '../method.ts'

/** Bearing factor by friction angle in degrees, NAVFAC DM 7.02 p. 7.2-193. */
export const navfacBearing = {
  driven: [
    [26, 10],
    [28, 15],
    [30, 21],
    [31, 24],
    [32, 29],
    [33, 35],
    [34, 42],
    [35, 50],
    [36, 62],
    [37, 77],
    [38, 86],
    [39, 120],
    [40, 145],
  ],
  bored: [
    [26, 5],
    [28, 8],
    [30, 10],
    [31, 12],
    [32, 14],
    [33, 17],
    [34, 21],
    [35, 25],
    [36, 30],
    [37, 38],
    [38, 43],
    [39, 60],
    [40, 72],
  ],
} as const

export const sandBase = formula({
  symbol: 'q_b',
  name: 'unit base resistance',
  unit: 'kPa',
  text: 'sigma_v * N_q',
  where: { sigma_v: 'kPa', N_q: '1' },
  source: practice('effective stress bearing resistance'),
})

/** q_b = sigma_v N_q, the stress held below 20 widths. */
export const navfacBase1986: BaseMethod = {
  id: 'navfac-1986',
  kind: 'granular-base',
  title: 'NAVFAC DM 7.02, N_q by table',
  installations: ['driven', 'bored', 'continuous-flight-auger'],
  needs: ['frictionAngle'],
  parameters: {},
  formulas: [heldDepth, sandBase],
  validity: 'Friction angles from 26 to 40 degrees.',
  source: 'navfac-dm-7-02',
  unitBaseResistance: (at) => {
    const phi = at.parameter('frictionAngle', 'phi', 'deg')
    const table = navfacBearing[at.installation === 'driven' ? 'driven' : 'bored']
    const [low, high] = [table[0][0], table[table.length - 1]![0]]
    if (phi.value < low || phi.value > high) {
      at.notice({
        code: 'outside-range',
        level: 'warning',
        pointer: at.pointer,
        text: `The N_q table of navfac-1986 runs from ${low} to ${high} degrees; ${at.layer.name} has ${phi.value.toFixed(1)}: the value at the end of the table was taken.`,
      })
    }
    const N_q = at.sheet.lookup(
      { symbol: 'N_q', name: 'bearing factor', unit: '1' },
      table,
      phi,
      cite('navfac-dm-7-02', 'p. 7.2-193, bearing factor by friction angle'),
    )
    return at.sheet.step(sandBase, { sigma_v: heldStress(at, at.breadth), N_q })
  },
}
