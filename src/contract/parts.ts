import { z } from 'zod'
import type { DesignBasis } from '../engine/design-basis/design-basis.ts'
import type { GroundProfile } from '../engine/ground/profile-types.ts'
import type { Layout } from '../engine/piles/layout.ts'
import type { PileType } from '../engine/piles/pile-type.ts'
import { limits } from './limits.ts'
import { quantity, varying } from './quantity.ts'

const name = z.string().min(1).max(200)
const anyLayer = {
  name,
  thickness: quantity('m', 'thickness; may be left out on the last layer', { above: 0, max: 1000 }).optional(),
  unitWeight: quantity('kN/m3', 'bulk unit weight; below water: saturated', { above: 0, max: 40 }),
  sptN60: quantity('1', 'SPT blow count N60', { min: 0, max: 300 }).optional(),
  coneResistance: varying('kPa', 'cone resistance', { min: 0, max: 200e3 }).optional(),
  youngsModulus: varying('kPa', "Young's modulus", { above: 0, max: 1e9 }).optional(),
  poissonsRatio: quantity('1', "Poisson's ratio", { min: 0, max: 0.5 }).optional(),
}
const angle = { min: 0, max: 50 }
const layer = z.discriminatedUnion('soil', [
  z.strictObject({
    ...anyLayer,
    soil: z.literal('cohesive'),
    undrainedShearStrength: varying('kPa', 'undrained shear strength', { min: 0, max: 5000 }).optional(),
    plasticityIndex: quantity('1', 'plasticity index, percent', { min: 0, max: 200 }).optional(),
    overconsolidationRatio: quantity('1', 'overconsolidation ratio', { min: 1, max: 100 }).optional(),
    effectiveFrictionAngle: quantity('deg', 'effective friction angle', angle).optional(),
  }),
  z.strictObject({
    ...anyLayer,
    soil: z.literal('granular'),
    frictionAngle: quantity('deg', 'friction angle', angle).optional(),
    relativeDensity: quantity('1', 'relative density, percent', { min: 0, max: 100 }).optional(),
  }),
  z.strictObject({
    ...anyLayer,
    soil: z.literal('rock'),
    unconfinedCompressiveStrength: varying('kPa', 'unconfined compressive strength', { min: 0, max: 500e3 }).optional(),
    rqd: quantity('1', 'rock quality designation, percent', { min: 0, max: 100 }).optional(),
  }),
])

export const groundProfile = z.strictObject({
  name: name.optional(),
  waterTableDepth: quantity('m', 'depth of the water table; left out: below all', { min: 0, max: 1000 }).optional(),
  layers: z.array(layer).min(1).max(limits.layers),
  rigidBase: z.boolean().optional(),
}) satisfies z.ZodType<GroundProfile>

const size = (description: string) => quantity('m', description, { above: 0, max: 20 })
const section = z.discriminatedUnion('shape', [
  z.strictObject({ shape: z.literal('circular'), diameter: size('diameter') }),
  z.strictObject({ shape: z.literal('square'), width: size('width') }),
  z.strictObject({
    shape: z.literal('tubular'),
    diameter: size('outer diameter'),
    wallThickness: size('wall thickness'),
    toe: z.enum(['open', 'closed']),
  }),
  z.strictObject({
    shape: z.literal('h'),
    depth: size('section depth'),
    flangeWidth: size('flange width'),
    area: quantity('m2', 'steel area', { above: 0, max: 10 }),
  }),
])

export const pileType = z.strictObject({
  section,
  length: quantity('m', 'length', { min: 0.1, max: 500 }),
  headDepth: quantity('m', 'depth of the head below the surface', { min: 0, max: 500 }).optional(),
  installation: z.enum(['driven', 'bored', 'continuous-flight-auger']),
  youngsModulus: quantity('kPa', "Young's modulus of the pile", { above: 0, max: 1e9 }).optional(),
  baseDiameter: size('diameter of an enlarged base').optional(),
  unitWeight: quantity('kN/m3', 'unit weight of the pile', { above: 0, max: 100 }).optional(),
  sectionResistance: z
    .strictObject({
      compression: quantity('kN', 'design resistance of the section', { above: 0 }).optional(),
      tension: quantity('kN', 'design resistance of the section', { above: 0 }).optional(),
    })
    .optional(),
}) satisfies z.ZodType<PileType>

const place = (axis: string) => quantity('m', `position along ${axis}`, { min: -1e5, max: 1e5 })
const spacing = quantity('m', 'spacing of the pile axes', { above: 0, max: 1000 }).optional()
const count = z.int().min(1).max(limits.pilesPerCap)
export const layout = z.discriminatedUnion('kind', [
  z
    .strictObject({
      kind: z.literal('grid'),
      columns: count,
      rows: count,
      spacing,
      spacingX: spacing,
      spacingY: spacing,
    })
    .superRefine((grid, context) => {
      if (grid.columns * grid.rows > limits.pilesPerCap) {
        context.addIssue({
          code: 'custom',
          path: ['columns'],
          params: { code: 'too-many-piles', got: grid.columns * grid.rows, limit: limits.pilesPerCap },
        })
      }
      for (const [n, key] of [
        [grid.columns, 'spacingX'],
        [grid.rows, 'spacingY'],
      ] as const) {
        if (n > 1 && grid.spacing === undefined && grid[key] === undefined)
          context.addIssue({ code: 'custom', path: ['spacing'], params: { code: 'missing-field', field: 'spacing' } })
      }
    }),
  z.strictObject({ kind: z.literal('ring'), count, radius: quantity('m', 'radius', { above: 0, max: 1000 }) }),
  z.strictObject({
    kind: z.literal('points'),
    points: z
      .array(z.strictObject({ x: place('x'), y: place('y') }))
      .min(1)
      .max(limits.pilesPerCap),
  }),
]) satisfies z.ZodType<Layout>

const factor = (description: string) => quantity('1', description, { above: 0, max: 20 })
export const designBasis = z.discriminatedUnion('format', [
  z.strictObject({
    format: z.literal('overall-factor'),
    factor: factor('overall factor'),
    blockFactor: factor('overall factor of the block').optional(),
    upliftFactor: factor('overall factor in uplift').optional(),
    split: z.strictObject({ shaft: factor('factor on the shaft'), base: factor('factor on the base') }).optional(),
  }),
  z.strictObject({
    format: z.literal('en1997-1-2004'),
    approach: z.enum(['DA1-1', 'DA1-2', 'DA2', 'DA3']),
    characteristic: z.discriminatedUnion('route', [
      z.strictObject({ route: z.literal('model-factor'), value: quantity('1', 'model factor', { min: 1, max: 5 }) }),
      z.strictObject({
        route: z.literal('profiles'),
        count: z.int().min(1).max(1000),
        stiffStructure: z.boolean().optional(),
      }),
    ]),
  }),
  z.strictObject({
    format: z.literal('custom'),
    shaft: factor('factor on the shaft'),
    base: factor('factor on the base'),
    block: factor('factor on the block'),
    uplift: factor('factor in uplift'),
  }),
]) satisfies z.ZodType<DesignBasis>
