import type { SettlementRequest } from '../engine/requests.ts'
import type { Trace } from '../engine/trace/step.ts'
import { curveFigure } from './draw/curve-figure.ts'
import { depthFigure } from './draw/depth-figure.ts'
import { layoutFigure } from './draw/layout-figure.ts'
import { givenWords } from './given-words.ts'
import { html, type Markup } from './markup.ts'
import { answerLine, type Outcome, outcomeTable } from './outcome-table.ts'
import { shortQuantity, unitLabel } from './quantity.ts'
import type { Calculation } from './record.ts'
import { type SheetParts, sheetPage } from './sheet.ts'
import { blockAngle, pilePoints, shaftStretches } from './trace-views.ts'

type Safe = { readonly designResistance?: number; readonly allowableLoad?: number; readonly ultimateResistance: number }

/** The sheet of a calculator's answer. The answer must hold a trace. */
export function calculationSheet(calculation: Calculation): string {
  const { request, answer, meta } = calculation
  const trace = answer.trace ?? { steps: [], results: {}, sources: [] }
  const parts = partsOf(calculation)
  return sheetPage({
    issue: { contentHash: meta.requestHash, engine: meta.engine, signatures: [] },
    kind: 'Calculation sheet',
    given: givenWords({ ...request, pile: request.pile, ground: request.ground }),
    notices: answer.notices,
    trace,
    layerNames: request.ground.layers.map((l) => l.name),
    ...parts,
  })
}

type Parts = Pick<SheetParts, 'subject' | 'question' | 'verdict' | 'drawings'>

function partsOf(c: Calculation): Parts {
  const trace = c.answer.trace ?? { steps: [], results: {}, sources: [] }
  const where = c.request.ground.name ? ` at ${c.request.ground.name}` : ''
  const verdict =
    (head: Markup, outcomes: readonly Outcome[]): SheetParts['verdict'] =>
    (lines) =>
      html`${head}${outcomeTable(trace, lines, outcomes)}`
  const depth = (axial?: { head: number; toe: number }) =>
    depthFigure('depth', {
      ground: c.request.ground,
      pile: c.request.pile,
      shaft: shaftStretches(trace, ''),
      ...(axial && { axial }),
      uplift: 'direction' in c.request && c.request.direction === 'uplift',
    })
  const { pile } = c.request
  switch (c.kind) {
    case 'single-pile': {
      const r = c.answer.result
      return {
        subject: `Resistance of one pile${where}`,
        question: html`What does one pile carry in ${c.request.direction ?? 'compression'}?`,
        verdict: verdict(safeAnswer('One pile carries', r), [...safeOutcomes('', r), ...pileOutcomes('', r)]),
        drawings: [depth({ head: r.ultimateResistance, toe: r.weight === undefined ? r.baseResistance : 0 })],
      }
    }
    case 'block': {
      const r = c.answer.result
      return {
        subject: `Resistance of the block${where}`,
        question: html`What does the block of soil and piles carry in ${c.request.direction ?? 'compression'}?`,
        verdict: verdict(safeAnswer('The block carries', r), [...safeOutcomes('', r), ...blockOutcomes('', r)]),
        drawings: [
          layoutFigure('plan', {
            points: pilePoints(c.request.layout),
            section: pile.section,
            block: { breadth: r.breadth, length: r.length, angle: blockAngle(trace, '') },
          }),
          depth(),
        ],
      }
    }
    case 'group': {
      const r = c.answer.result
      return {
        subject: `Piles against block${where}`,
        question: html`Do the piles govern, or the block of soil that they enclose, and what does the group carry in ${c.request.direction ?? 'compression'}?`,
        verdict: verdict(
          html`${safeAnswer('The group carries', r)}<p class="governs">${r.governing === 'piles' ? 'The piles, each on its own, govern.' : 'The block governs.'}</p>`,
          [
            ...safeOutcomes('', r),
            { name: 'sum of the single piles', pointer: '/sumOfPiles', value: r.sumOfPiles, unit: 'kN' },
            { name: 'block', pointer: '/block/ultimateResistance', value: r.block.ultimateResistance, unit: 'kN' },
            { name: 'efficiency', pointer: '/efficiency', value: r.efficiency, unit: '1' },
            { name: 'one pile', pointer: '/single/ultimateResistance', value: r.single.ultimateResistance, unit: 'kN' },
            ...pileOutcomes('/single', r.single),
            ...blockOutcomes('/block', r.block),
          ],
        ),
        drawings: [
          layoutFigure('plan', {
            points: pilePoints(c.request.layout),
            section: pile.section,
            block: { breadth: r.block.breadth, length: r.block.length, angle: blockAngle(trace, '') },
          }),
          depth({
            head: r.single.ultimateResistance,
            toe: r.single.weight === undefined ? r.single.baseResistance : 0,
          }),
        ],
      }
    }
    case 'settlement': {
      const { single, group } = c.answer.result
      const main = group ?? single
      return {
        subject: `Settlement${where}`,
        question: html`How far do ${group ? 'the piles' : 'one pile'} settle under the load, and how stiff are they?`,
        verdict: verdict(answerLine(group ? 'The group settles' : 'The pile settles', main.settlement, 'mm'), [
          ...(group
            ? ([
                { name: 'settlement of the group', pointer: '/group/settlement', value: group.settlement, unit: 'mm' },
                {
                  name: 'ratio to one pile',
                  pointer: '/group/settlementRatio',
                  value: group.settlementRatio,
                  unit: '1',
                },
                { name: 'tilt along x', pointer: '/group/tilt/alongX', value: group.tilt.alongX, unit: '1' },
                { name: 'tilt along y', pointer: '/group/tilt/alongY', value: group.tilt.alongY, unit: '1' },
                {
                  name: 'vertical stiffness',
                  pointer: '/group/stiffness/vertical',
                  value: group.stiffness.vertical,
                  unit: 'kN/m',
                },
                {
                  name: 'rocking stiffness along x',
                  pointer: '/group/stiffness/rockingAlongX',
                  value: group.stiffness.rockingAlongX,
                  unit: 'kN.m/rad',
                },
                {
                  name: 'rocking stiffness along y',
                  pointer: '/group/stiffness/rockingAlongY',
                  value: group.stiffness.rockingAlongY,
                  unit: 'kN.m/rad',
                },
              ] as const)
            : []),
          { name: 'load of one pile', pointer: '/single/load', value: single.load, unit: 'kN' },
          { name: 'settlement of one pile', pointer: '/single/settlement', value: single.settlement, unit: 'mm' },
          { name: 'stiffness of one pile', pointer: '/single/stiffness', value: single.stiffness, unit: 'kN/m' },
          { name: 'influence factor', pointer: '/single/influenceFactor', value: single.influenceFactor, unit: '1' },
          {
            name: 'share of the load at the base',
            pointer: '/single/baseLoadShare',
            value: single.baseLoadShare,
            unit: '1',
          },
        ]),
        drawings: [
          ...(group && c.request.layout
            ? [
                layoutFigure('plan', {
                  points: pilePoints(c.request.layout),
                  section: pile.section,
                  loads: group.piles.map((p) => p.load),
                }),
              ]
            : []),
          settledDepth(c.request, single),
          ...interactionCurves(trace),
          ...settlementCurves(c.answer.result, c.request.load.V),
        ],
      }
    }
  }
}

type Settled = Extract<Calculation, { kind: 'settlement' }>['answer']['result']

/** Load–settlement curves, where the method gives them; the cross is the load that was asked about. */
function settlementCurves({ single, group }: Settled, V: number): Markup[] {
  const one = (id: string, of: string, points: Settled['single']['curve'], at: { load: number; settlement: number }) =>
    points === undefined || points.length < 2
      ? []
      : [
          curveFigure(id, {
            title: `Load and settlement of ${of}`,
            description: 'Settlement under a rising load; dots are the computed points, the cross is the given load.',
            x: { title: 'load', unit: 'kN' },
            y: { title: 'settlement', unit: 'mm', downward: true },
            curve: points.map((p) => ({ x: p.load, y: p.settlement })),
            marks: [{ x: at.load, y: at.settlement, name: shortQuantity(at.settlement, 'mm') }],
          }),
        ]
  return [
    ...one('curve-one', 'one pile', single.curve, single),
    ...(group ? one('curve-group', 'the group', group.curve, { load: V, settlement: group.settlement }) : []),
  ]
}

function safeAnswer(words: string, r: Safe): Markup {
  if (r.allowableLoad !== undefined) return answerLine(`${words} an allowable load of`, r.allowableLoad, 'kN')
  if (r.designResistance !== undefined) return answerLine(`${words} a design resistance of`, r.designResistance, 'kN')
  return answerLine(`${words}, unfactored,`, r.ultimateResistance, 'kN')
}

const safeOutcomes = (at: string, r: Safe): Outcome[] => [
  { name: 'allowable load', pointer: `${at}/allowableLoad`, value: r.allowableLoad, unit: 'kN' },
  { name: 'design resistance', pointer: `${at}/designResistance`, value: r.designResistance, unit: 'kN' },
  { name: 'ultimate resistance', pointer: `${at}/ultimateResistance`, value: r.ultimateResistance, unit: 'kN' },
]

type PileNumbers = {
  readonly shaftResistance: number
  readonly baseResistance: number
  readonly unitBaseResistance: number
  readonly toeDepth: number
  readonly weight?: number | undefined
}
export const pileOutcomes = (at: string, r: PileNumbers): Outcome[] => [
  { name: 'shaft of one pile', pointer: `${at}/shaftResistance`, value: r.shaftResistance, unit: 'kN' },
  { name: 'base of one pile', pointer: `${at}/baseResistance`, value: r.baseResistance, unit: 'kN' },
  { name: 'unit base resistance', pointer: `${at}/unitBaseResistance`, value: r.unitBaseResistance, unit: 'kPa' },
  { name: 'effective weight', pointer: `${at}/weight`, value: r.weight, unit: 'kN' },
  { name: 'depth of the toe', pointer: `${at}/toeDepth`, value: r.toeDepth, unit: 'm' },
]

type BlockNumbers = {
  readonly breadth: number
  readonly length: number
  readonly depth: number
  readonly sideResistance: number
  readonly baseResistance: number
}
export const blockOutcomes = (at: string, r: BlockNumbers): Outcome[] => [
  { name: 'breadth of the block', pointer: `${at}/breadth`, value: r.breadth, unit: 'm' },
  { name: 'length of the block', pointer: `${at}/length`, value: r.length, unit: 'm' },
  { name: 'sides of the block', pointer: `${at}/sideResistance`, value: r.sideResistance, unit: 'kN' },
  { name: 'base of the block', pointer: `${at}/baseResistance`, value: r.baseResistance, unit: 'kN' },
]

type SettledPile = Extract<Calculation, { kind: 'settlement' }>['answer']['result']['single']

/** Ground and pile under the load that it settles by; with stress and load along it where the method solves for them. */
function settledDepth({ ground, pile }: SettlementRequest, single: SettledPile): Markup {
  const { axial } = single
  const head = pile.headDepth ?? 0
  const shaft = (axial ?? []).map((a, i) => ({
    top: axial![i - 1]?.depth ?? head,
    bottom: a.depth,
    unit: a.shaftStress,
  }))
  const along = [
    { depth: head, load: single.load },
    ...(axial ?? []).map((a) => ({ depth: a.depth, load: a.axialLoad })),
  ]
  return depthFigure('depth', {
    ground,
    pile,
    shaft,
    ...(axial && { axial: { head: single.load, toe: axial.at(-1)!.axialLoad, along } }),
    uplift: single.load < 0,
  })
}

/** Interaction of two piles with their spacing, where a solution was read from such a table. */
function interactionCurves(trace: Trace): Markup[] {
  return trace.steps.flatMap((step, i) => {
    if (step.kind !== 'solution' || !step.table || step.symbol !== 'alpha') return []
    const [x, y] = step.table.columns
    if (!x || !y) return []
    return [
      curveFigure(`interaction-${i}`, {
        title: 'Interaction of two piles',
        description:
          "Share of a pile's settlement that its neighbour takes, by spacing on a logarithmic scale; dots are the computed points.",
        x: { title: 'spacing', unit: unitLabel(x.unit), log: true },
        y: { title: 'interaction factor', unit: '–' },
        curve: step.table.rows.map(([s = 0, alpha = 0]) => ({ x: s, y: alpha })),
      }),
    ]
  })
}
