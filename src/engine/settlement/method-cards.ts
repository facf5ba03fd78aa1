import type { MethodCard } from '../methods/method.ts'
import type { Formula } from '../trace/formula.ts'
import { elementForce, loadBelow, shearOf } from './along-pile.ts'
import { axialStiffness } from './elastic-continuum.ts'
import { planeSettlement, settlementRatioOf } from './group-settlement.ts'
import { equivalentRadius, toeDepthOf } from './pile-geometry.ts'
import { originSettlement, tiltAlongX, tiltAlongY, tiltOf } from './prepared-group.ts'
import {
  baseNumber,
  baseShareFormula,
  headStiffness,
  influenceRadius,
  muFormula,
  shaftNumber,
  stiffnessNumber,
  zetaFormula,
} from './randolph-wroth-1978.ts'
import { headSettlement, influenceFactorOf, loadPerPile } from './settlement.ts'

const formulas = (...all: unknown[]) => all as readonly Formula[]
const common = {
  kind: 'settlement',
  installations: ['driven', 'bored', 'continuous-flight-auger'],
  needs: ['youngsModulus'],
  parameters: {},
} as const
const group = [
  loadPerPile,
  headSettlement,
  influenceFactorOf,
  originSettlement,
  tiltAlongX,
  tiltAlongY,
  tiltOf,
  planeSettlement,
  settlementRatioOf,
]

/** The methods of settlement, as they are listed to users. */
export const settlementCards: readonly MethodCard[] = [
  {
    ...common,
    id: 'elastic-continuum',
    title: 'Piles on a layered elastic continuum',
    source: 'mindlin-1936',
    theory:
      'The shaft is cut into cylinders with uniform shear, the base is a rigid punch; every one moves with the pile, which is an elastic bar. The ground between them is a half-space of horizontal elastic layers: each pair of elements is the closed form of Mindlin (1936) for a homogeneous half-space plus the exact difference that the layers make, found from the layers\' stiffness by wavenumber and integrated by a Hankel transform. Two equal piles give the interaction factor by spacing; a group superposes it (Poulos & Davis 1980) under a rigid or flexible cap, or couples every element with coupling "full". With nonlinearity "hyperbolic" the own springs of shaft and base soften towards their ultimate resistance (Fleming 1992), and what piles do to one another stays elastic.',
    validity:
      "Layers of constant or linear modulus, Poisson's ratio 0 to 0.5, rigid base at any depth from the toe down, head at or below the surface, any section by its circle of equal area. Piles at least 1.5 diameters apart, up to 2 500 in a cap, up to 64 with coupling full, up to 225 under a rigid cap with nonlinearity. Working loads, unless nonlinearity is asked for: no slip, no gap, no consolidation with time.",
    errorBounds:
      'Against finite elements: single piles within 2 %, 5 % for a toe on ground more than 50 times stiffer than along the shaft; on the high side by 0.3 to 1.5 %. Against converged boundary elements: 0.2 %. Interaction factors within 0.001; superposition lies above full coupling by 0 to 5 % for stiff piles, up to 14 % for very compressible ones. Twice the elements change the settlement by less than 0.2 %. The ground flexibility is symmetric to 0.5 % of its diagonal before it is made so. A modulus linear with depth is followed by slices: 0.3 %. The share of the base is poorly conditioned.',
    formulas: formulas(toeDepthOf, equivalentRadius, axialStiffness, ...group, elementForce, shearOf, loadBelow),
  },
  {
    ...common,
    id: 'randolph-wroth-1978',
    title: 'Randolph & Wroth, closed form for single piles and groups',
    source: 'randolph-wroth-1978',
    validity:
      'Ground whose stiffness is even or grows with depth (inhomogeneity ratio 0.5 to 1), on a base as stiff or stiffer; no rigid base. A shear modulus averaged over the shaft stands for its layers.',
    errorBounds:
      'Settlement of single piles 7 to 10 % low at L/d = 10, within 2 % for L/d >= 50 with stiff piles, 10 to 18 % high for long compressible ones.',
    formulas: formulas(
      equivalentRadius,
      influenceRadius,
      zetaFormula,
      muFormula,
      baseNumber,
      shaftNumber,
      stiffnessNumber,
      headStiffness,
      baseShareFormula,
      ...group,
    ),
  },
]
