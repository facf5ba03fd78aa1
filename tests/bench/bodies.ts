/** The requests that the bench sends. */

const clay = (name: string, thickness: number | undefined, undrainedShearStrength: object | number) => ({
  name,
  ...(thickness !== undefined && { thickness }),
  unitWeight: 17,
  soil: 'cohesive',
  undrainedShearStrength,
  youngsModulus: 20e3,
})
const sand = (name: string, thickness: number, frictionAngle: number) => ({
  name,
  thickness,
  unitWeight: 19.5,
  soil: 'granular',
  frictionAngle,
  youngsModulus: 45e3,
})

/** Five layers; the pile reaches the last one. */
const ground = (shift: number) => ({
  name: `BH${shift + 1}`,
  waterTableDepth: 1.5,
  layers: [
    clay('soft clay', 2.5, { top: 18, bottom: 26 + shift }),
    sand('loose sand', 2.5, 31),
    clay('firm clay', 3, { top: 45, bottom: 60 + shift }),
    sand('dense sand', 2.5, 36),
    clay('stiff clay', undefined, 140 + 10 * shift),
  ],
})
const pile = (diameter: number, length: number) => ({
  section: { shape: 'circular', diameter },
  length,
  headDepth: 0.5,
  installation: 'bored',
  youngsModulus: 30e6,
  unitWeight: 24,
  sectionResistance: { compression: 9000, tension: 900 },
})

export const singlePileBody = {
  pile: pile(0.75, 10.9),
  ground: ground(0),
  designBasis: { format: 'overall-factor', factor: 2.5, blockFactor: 3 },
}

const LAYOUTS = [
  { kind: 'grid', columns: 3, rows: 3, spacing: 2.4 },
  { kind: 'ring', count: 9, radius: 3.6 },
] as const

/**
 * A schedule of so many caps of nine piles under so many combinations, three in four of them `working`. Five pile types,
 * two profiles and two layouts give twenty sets. The loads differ from row to row; some caps are pulled by some combinations.
 */
export function scheduleBody(caps: number, combinations: number) {
  const name = (c: number) => `${c % 4 === 3 ? 'S' : 'W'}${c + 1}`
  const wave = (cap: number, c: number, period: number) => Math.sin((cap * 31 + c * 17) / period)
  const side = Math.ceil(Math.sqrt(caps))
  const marks = Array.from({ length: caps }, (_, i) => `C${i + 1}`)
  return {
    title: `Bench, ${caps} caps, ${combinations} combinations`,
    designBasis: { format: 'overall-factor', factor: 2.5, blockFactor: 3, upliftFactor: 3 },
    ground: { BH1: ground(0), BH2: ground(1) },
    pileTypes: Object.fromEntries(
      Array.from({ length: 5 }, (_, i) => [`B${i + 1}`, pile(0.6 + 0.05 * i, 10.5 + 0.5 * i)]),
    ),
    caps: marks.map((mark, i) => ({
      mark,
      x: 9 * (i % side) + (i % 3),
      y: 9 * Math.floor(i / side) + (i % 2),
      ground: i % 2 === 0 ? 'BH1' : 'BH2',
      pileType: `B${(i % 5) + 1}`,
      layout: LAYOUTS[Math.floor(i / 10) % 2]!,
      capWeight: 150 + (i % 7) * 10,
    })),
    loads: {
      signs: 'right-handed-z-up',
      loadsAre: 'reactions',
      combinations: Object.fromEntries(
        Array.from({ length: combinations }, (_, c) => [
          name(c),
          { limitState: c % 4 === 3 ? 'serviceability' : 'working' },
        ]),
      ),
      rows: marks.flatMap((cap, i) =>
        Array.from({ length: combinations }, (_, c) => ({
          cap,
          combination: name(c),
          Fx: 12.5,
          Fy: -8.25,
          Fz: Math.round(10 * (2600 + 2900 * wave(i, c, 3))) / 10,
          Mx: Math.round(10 * 420 * wave(i, c, 5)) / 10,
          My: Math.round(10 * 380 * wave(i, c, 7)) / 10,
          Mz: 0,
        })),
      ),
    },
    limits: { settlement: 25, tilt: 0.002, angularDistortion: 0.002 },
  }
}
