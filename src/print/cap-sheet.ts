import type { Cap } from '../engine/assessment/schedule.ts'
import { sliceTrace } from '../engine/index.ts'
import { overviewAt, pilesAt } from './addresses.ts'
import { blockOutcomes, pileOutcomes } from './calculation-sheet.ts'
import { checkWords } from './check-words.ts'
import { courses, verdictWord } from './draw/courses.ts'
import { depthFigure } from './draw/depth-figure.ts'
import { layoutFigure } from './draw/layout-figure.ts'
import { short } from './figure.ts'
import { givenWords } from './given-words.ts'
import type { Lines } from './lines.ts'
import { html, joined, type Markup } from './markup.ts'
import { lineOfResult, outcomeTable } from './outcome-table.ts'
import { shortQuantity } from './quantity.ts'
import type { AssessmentRecord, CapResult } from './record.ts'
import { sheetPage } from './sheet.ts'
import { blockAngle, pilePoints, prefixOf, shaftStretches } from './trace-views.ts'

const NO_TRACE = { steps: [], results: {}, sources: [] }

/** The calculation sheet of one cap of an assessment, whose result need hold no other cap; undefined where no cap has this mark. */
export function capSheet(record: AssessmentRecord, mark: string): string | undefined {
  const { schedule, reply } = record
  const index = schedule.caps.findIndex((cap) => cap.mark === mark)
  const cap = schedule.caps[index]
  const result = reply.result.caps.find((c) => c.mark === mark)
  if (!cap || !result) return undefined
  const ground = schedule.ground[cap.ground]!
  const pile = schedule.pileTypes[cap.pileType]!
  const at = `/caps/${index}`
  const trace = sliceTrace(reply.trace ?? NO_TRACE, at)
  const prefix = prefixOf(trace, `${at}/single/shaftResistance`)
  const governing = result.checks.find((c) => c.check === 'pile-compression')
  const exceeded = result.checks.filter((c) => !c.satisfied)
  return sheetPage({
    issue: record,
    kind: 'Calculation sheet',
    links:
      record.id === undefined
        ? []
        : [
            [overviewAt(record.id), 'All caps'],
            [pilesAt(record.id), 'Schedule of piles'],
          ],
    subject: `Cap ${mark}`,
    question: html`Do the piles of cap ${mark} carry every combination with the margin that the design basis asks, and does the cap settle within its limits?`,
    verdict: (
      lines,
    ) => html`<p class="answer ${exceeded.length > 0 ? 'fails' : 'stands'}"><strong>${exceeded.length > 0 ? 'No' : 'Yes'}</strong> <span>${
      exceeded.length > 0
        ? html`exceeded: ${exceeded.map((c, i) => html`${i > 0 && ', '}${checkWords[c.check].name} in ${c.combination}`)}`
        : 'every check holds'
    }</span></p>${checks(result, at, trace, lines)}${settlements(result, at, trace, lines)}${neighbours(record, mark)}
<h3>Resistance and stiffness</h3>${outcomeTable(trace, lines, [
      { name: 'number of piles', pointer: `${at}/pileCount`, value: result.pileCount, unit: '1' },
      {
        name: 'one pile, ultimate',
        pointer: `${at}/single/ultimateResistance`,
        value: result.single.ultimateResistance,
        unit: 'kN',
      },
      ...pileOutcomes(`${at}/single`, result.single),
      {
        name: 'block, ultimate',
        pointer: `${at}/block/ultimateResistance`,
        value: result.block.ultimateResistance,
        unit: 'kN',
      },
      ...blockOutcomes(`${at}/block`, result.block),
      {
        name: 'vertical stiffness',
        pointer: `${at}/stiffness/vertical`,
        value: result.stiffness.vertical,
        unit: 'kN/m',
      },
      {
        name: 'rocking stiffness along x',
        pointer: `${at}/stiffness/rockingAlongX`,
        value: result.stiffness.rockingAlongX,
        unit: 'kN.m/rad',
      },
      {
        name: 'rocking stiffness along y',
        pointer: `${at}/stiffness/rockingAlongY`,
        value: result.stiffness.rockingAlongY,
        unit: 'kN.m/rad',
      },
    ])}`,
    given: html`${givenWords({ pile, ground: { ...ground, name: ground.name ?? cap.ground }, designBasis: schedule.designBasis, ...(schedule.methods && { methods: schedule.methods }) })}${actions(record, cap)}`,
    drawings: [
      layoutFigure('plan', {
        points: pilePoints(cap.layout),
        section: pile.section,
        block: { breadth: result.block.breadth, length: result.block.length, angle: blockAngle(trace, prefix) },
        ...(governing?.pile !== undefined && {
          loads: pilePoints(cap.layout).map((_, i) => (i + 1 === governing.pile ? governing.demand : undefined)),
          loadsAre: `load of the most loaded pile in kN, combination ${governing.combination}`,
        }),
      }),
      depthFigure('depth', {
        ground,
        pile,
        shaft: shaftStretches(trace, prefix),
        axial: { head: result.single.ultimateResistance, toe: result.single.baseResistance },
        uplift: false,
      }),
    ],
    notices: [...reply.notices, ...result.notices],
    trace,
    layerNames: ground.layers.map((l) => l.name),
  })
}

type Trace = Parameters<typeof lineOfResult>[0]

function checks(result: CapResult, at: string, trace: Trace, lines: Lines): Markup {
  const rows = result.checks.map((c, i) => {
    const { name, unit } = checkWords[c.check]
    const found = (field: string) => lineOfResult(trace, lines, `${at}/checks/${i}/${field}`)
    return html`<tr class="${c.satisfied ? '' : 'exceeds'}"><th scope="row">${name}${c.pile !== undefined && html` <span class="name">pile ${c.pile}</span>`}</th><td>${c.combination}</td><td class="num">${shortQuantity(c.demand, unit)}${found('demand')}</td><td class="num">${shortQuantity(c.resistance, unit)}${found('resistance')}</td><td class="num">${short(c.utilisation)}${found('utilisation')}</td><td class="sign">${courses(c.utilisation)}</td><td>${verdictWord(c.satisfied)}</td></tr>
`
  })
  return html`<div class="wide" tabindex="0" role="region" aria-label="Checks"><table class="checks"><caption>Checks, each in its governing combination</caption><thead><tr><th scope="col">check</th><th scope="col">combination</th><th scope="col" class="num">demand</th><th scope="col" class="num">resistance or limit</th><th scope="col" class="num">utilisation</th><th scope="col"><span class="unseen">drawn</span></th><th scope="col">verdict</th></tr></thead><tbody>${joined(rows)}</tbody></table></div>`
}

function settlements(result: CapResult, at: string, trace: Trace, lines: Lines): Markup {
  if (result.settlement.length === 0) return html``
  const rows = result.settlement.map(
    (
      s,
      i,
    ) => html`<tr><th scope="row">${s.combination}</th><td class="num">${shortQuantity(s.settlement, 'mm')}${lineOfResult(trace, lines, `${at}/settlement/${i}/settlement`)}</td><td class="num">${short(s.tilt)}${lineOfResult(trace, lines, `${at}/settlement/${i}/tilt`)}</td></tr>
`,
  )
  return html`<table class="settles"><caption>Settlement at the centroid of the piles, and tilt</caption><thead><tr><th scope="col">combination</th><th scope="col" class="num">settlement</th><th scope="col" class="num">tilt</th></tr></thead><tbody>${joined(rows)}</tbody></table>`
}

function neighbours({ reply }: AssessmentRecord, mark: string): Markup {
  const own = reply.result.neighbours.filter((n) => n.a === mark || n.b === mark)
  if (own.length === 0) return html``
  const rows = own.map(
    (
      n,
    ) => html`<tr><th scope="row">${n.a === mark ? n.b : n.a}</th><td>${n.combination}</td><td class="num">${shortQuantity(n.distance, 'm')}</td><td class="num">${shortQuantity(n.differentialSettlement, 'mm')}</td><td class="num">${short(n.angularDistortion)}</td><td class="num">${n.utilisation === undefined ? '–' : short(n.utilisation)}</td><td>${n.satisfied === undefined ? '' : verdictWord(n.satisfied)}</td></tr>
`,
  )
  return html`<div class="wide" tabindex="0" role="region" aria-label="Neighbouring caps"><table class="neighbours"><caption>Against its neighbours</caption><thead><tr><th scope="col">cap</th><th scope="col">combination</th><th scope="col" class="num">distance</th><th scope="col" class="num">differential settlement</th><th scope="col" class="num">angular distortion</th><th scope="col" class="num">utilisation</th><th scope="col">verdict</th></tr></thead><tbody>${joined(rows)}</tbody></table></div>`
}

/** The reactions or actions of the model for this cap, as they came. */
function actions({ schedule }: AssessmentRecord, cap: Cap): Markup {
  const rows = schedule.loads.rows.filter((row) => row.cap === cap.mark)
  const [first] = rows
  if (!first) return html``
  const components = Object.keys(first).filter((key) => key !== 'cap' && key !== 'combination')
  const unit = (c: string) => (c.startsWith('M') ? 'kN·m' : 'kN')
  const lines = rows.map(
    (
      row,
    ) => html`<tr><th scope="row">${row.combination}</th><td>${schedule.loads.combinations[row.combination]?.limitState}</td>${components.map((c) => html`<td class="num">${short(Number(row[c as keyof typeof row]))}</td>`)}</tr>
`,
  )
  return html`<div class="wide" tabindex="0" role="region" aria-label="Loads of the model"><table class="actions"><caption>${schedule.loads.loadsAre === 'reactions' ? 'Reactions' : 'Actions'} of the structural model, signs ${schedule.loads.signs}</caption><thead><tr><th scope="col">combination</th><th scope="col">limit state</th>${components.map((c) => html`<th scope="col" class="num">${c} <span class="unit">[${unit(c)}]</span></th>`)}</tr></thead><tbody>${joined(lines)}</tbody></table></div>`
}
