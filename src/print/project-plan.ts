import { asked, pilesAt, sheetAt } from './addresses.ts'
import { type CheckKind, checkWords } from './check-words.ts'
import { courses, verdictWord } from './draw/courses.ts'
import { planMap } from './draw/plan-map.ts'
import { short } from './figure.ts'
import { html, joined, type Markup } from './markup.ts'
import { page } from './page.ts'
import { byUtilisation, inputChanges, type PlanCap, planCaps } from './plan-view.ts'
import { shortQuantity } from './quantity.ts'
import type { AssessmentRecord, AssessmentResult } from './record.ts'
import { paperStrip, titleBlock } from './title-block.ts'

export type PlanOptions = {
  /** The revision that this one is laid beside. */
  readonly previous?: AssessmentRecord | undefined
  readonly check?: CheckKind | undefined
  /** The path that the page was asked at. Left out: it cannot be asked again, and has no filter. */
  readonly at?: string
  /** Id of the revision before, to be offered beside this one. */
  readonly before?: string | undefined
}

/** All caps of an assessment in plan, and a table of them by utilisation; beside an earlier revision with what changed. */
export function projectPlan(record: AssessmentRecord, options: PlanOptions = {}): string {
  const { previous, check } = options
  const caps = planCaps(record, check)
  const before = previous && planCaps(previous, check)
  const { summary, neighbours } = record.reply.result
  const strained = neighbours.filter((n) => n.satisfied === false)
  const what = check ? checkWords[check].name : 'largest utilisation'
  const name = (r: AssessmentRecord) => (r.revision === undefined ? 'This assessment' : `Revision ${r.revision}`)
  const map = (r: AssessmentRecord, all: readonly PlanCap[], id: string, beside?: Parameters<typeof planMap>[4]) =>
    html`<div class="sheetlet"><h3>${name(r)}</h3><div class="wide" tabindex="0" role="region" aria-label="Plan, ${name(r)}">${planMap(id, r, all, `Caps in plan, ${what}, ${name(r)}`, beside)}</div></div>`
  const body = html`${titleBlock(record, record.schedule.title, 'Plan of the caps')}${others(record, options)}
<main>
<section id="verdict"><h2>Question and verdict</h2><p class="question">Which caps exceed, what governs them, and which neighbours settle apart too far?</p>
<p class="answer ${summary.exceeded > 0 || strained.length > 0 ? 'fails' : 'stands'}"><strong>${summary.exceeded > 0 ? html`${summary.exceeded} of ${summary.caps}` : html`All ${summary.caps}`}</strong> <span>${summary.exceeded > 0 ? (summary.exceeded === 1 ? 'caps exceeds a check' : 'caps exceed a check') : 'caps hold every check'}${summary.worst && html`; largest utilisation ${short(summary.worst.utilisation)}: ${worstWords(summary.worst)} in ${summary.worst.combination}`}</span></p>
<p>${strained.length > 0 ? html`<strong class="exceeds">Neighbours that distort too much:</strong> ${joined(strained.map((n, i) => html`${i > 0 && ', '}${n.a}–${n.b} (utilisation ${short(n.utilisation!)})`))}.` : 'No two neighbours distort too much.'}</p>
<p class="caution">${record.reply.notices[0]?.text}</p></section>
<section id="plan"><h2>Plan, ${what}</h2>${filters(options)}
<p class="legend">Outlines of the piles to scale. Stack of four courses: utilisation, a quarter each; a fifth course, crossed: exceeded. Dashed lines: equal settlement, straight between caps. Double line: neighbours that distort too much, with their utilisation.</p>
<div class="plans">${previous && before && map(previous, before, 'before', { record, caps })}${map(record, caps, 'now', previous && before && { record: previous, caps: before })}</div></section>
${previous && before && changes(previous, before, record, caps)}
<section id="caps"><h2>Caps by ${what}</h2>${table(record, caps, before)}</section>
</main>`
  return page({
    title: `${record.schedule.title}, plan`,
    strip: paperStrip(record, 'Plan of the caps'),
    body,
    script: '/print/plan.js',
    wide: true,
  })
}

function worstWords({ cap, neighbour, check }: NonNullable<AssessmentResult['summary']['worst']>): Markup {
  return check === 'angular-distortion'
    ? html`${cap}–${neighbour}, angular distortion`
    : html`${cap}, ${checkWords[check].name}`
}

function filters({ at, check, previous }: PlanOptions): Markup {
  if (at === undefined) return html``
  const link = (to: CheckKind | undefined, words: string) =>
    html`<a href="${asked(at, { check: to, since: previous?.id })}"${to === check && html` aria-current="page"`}>${words}</a>`
  return html`<nav class="filters" aria-label="Show one check">${link(undefined, 'the largest of all')}${Object.entries(checkWords).map(([kind, { name }]) => link(kind as CheckKind, name))}</nav>`
}

/** Other pages of the record, and this one beside the revision before or alone. */
function others({ id }: AssessmentRecord, { at, check, previous, before }: PlanOptions): Markup {
  if (id === undefined || at === undefined) return html``
  const link = (href: string, words: string) => html`<a class="leaves" href="${href}">${words}</a>`
  return html`<nav class="contents" aria-label="Other pages of this record">${link(pilesAt(id), 'Schedule of piles')}${
    previous
      ? link(asked(at, { check }), 'This revision alone')
      : before !== undefined && link(asked(at, { check, since: before }), 'Beside the revision before')
  }</nav>`
}

function table(record: AssessmentRecord, caps: readonly PlanCap[], before: readonly PlanCap[] | undefined): Markup {
  const old = new Map(before?.map((c) => [c.mark, c]))
  const rows = byUtilisation(caps).map((cap) => {
    const { shown } = cap
    const was = old.get(cap.mark)?.shown
    const earlier =
      before &&
      html`<td class="num">${was ? short(was.utilisation) : '–'}</td><td>${was ? checkWords[was.check].name : 'new'}</td>`
    const given = record.schedule.caps[cap.index]!
    return html`<tr id="cap-${cap.index}" data-cap="${cap.index}" class="${shown?.satisfied === false && 'exceeds'}"><th scope="row">${record.id === undefined ? cap.mark : html`<a href="${sheetAt(record.id, cap.mark)}">${cap.mark}</a>`}</th><td>${given.pileType}</td><td>${given.ground}</td>${
      shown
        ? html`<td class="num">${short(shown.utilisation)}</td><td class="sign">${courses(shown.utilisation)}</td><td>${checkWords[shown.check].name}</td><td>${shown.combination}</td><td class="num">${shortQuantity(shown.demand, checkWords[shown.check].unit)}</td><td class="num">${shortQuantity(shown.resistance, checkWords[shown.check].unit)}</td><td>${verdictWord(shown.satisfied)}</td>`
        : html`<td class="num">–</td><td></td><td>not asked</td><td></td><td></td><td></td><td></td>`
    }<td class="num">${cap.settlement === undefined ? '–' : shortQuantity(cap.settlement, 'mm')}</td>${earlier}</tr>
`
  })
  const head = (words: string, kind = '') => html`<th scope="col"${kind && html` class="${kind}"`}>${words}</th>`
  return html`<div class="wide" tabindex="0" role="region" aria-label="Caps"><table class="checks caps"><thead><tr>${head('cap')}${head('pile type')}${head('ground')}${head('utilisation', 'num')}<th scope="col"><span class="unseen">drawn</span></th>${head('governs')}${head('combination')}${head('demand', 'num')}${head('resistance or limit', 'num')}${head('verdict')}${head('settlement', 'num')}${before && html`${head('utilisation before', 'num')}${head('governed before')}`}</tr></thead><tbody>
${joined(rows)}</tbody></table></div>`
}

/** What changed between two revisions, in words and with the numbers of both. */
function changes(
  previous: AssessmentRecord,
  before: readonly PlanCap[],
  record: AssessmentRecord,
  caps: readonly PlanCap[],
): Markup {
  const old = new Map(before.map((c) => [c.mark, c]))
  const now = new Set(caps.map((c) => c.mark))
  const inputs = inputChanges(previous, record)
  const added = caps.filter((c) => !old.has(c.mark))
  const gone = before.filter((c) => !now.has(c.mark))
  const rows = caps.flatMap((cap) => {
    const was = old.get(cap.mark)
    const asked = inputs.get(cap.mark) ?? []
    if (!was?.shown || !cap.shown) return []
    const [a, b] = [was.shown, cap.shown]
    if (a.utilisation === b.utilisation && asked.length === 0) return []
    const way = b.utilisation > a.utilisation ? 'rises' : b.utilisation < a.utilisation ? 'falls' : 'stays'
    const verdict = a.satisfied === b.satisfied ? '' : b.satisfied ? 'now holds' : 'now exceeded'
    return [
      html`<tr class="${verdict === 'now exceeded' && 'exceeds'}"><th scope="row"><a href="#cap-${cap.index}">${cap.mark}</a></th><td class="num">${short(a.utilisation)}</td><td class="num">${short(b.utilisation)}</td><td>${way}</td><td>${a.check === b.check ? '' : html`${checkWords[b.check].name}, before ${checkWords[a.check].name}`}</td><td>${verdict === 'now exceeded' ? html`<strong>${verdict}</strong>` : verdict}</td><td>${asked.join(', ')}</td></tr>
`,
    ]
  })
  const names = (list: readonly PlanCap[]) => list.map((c) => c.mark).join(', ')
  return html`<section id="changes"><h2>What changed since revision ${previous.revision}</h2>
${added.length > 0 && html`<p>Caps added: ${names(added)}.</p>`}${gone.length > 0 && html`<p>Caps gone: ${names(gone)}.</p>`}${rows.length === 0 ? html`<p>No cap has another utilisation or another question.</p>` : html`<div class="wide" tabindex="0" role="region" aria-label="Changes"><table class="checks"><thead><tr><th scope="col">cap</th><th scope="col" class="num">before</th><th scope="col" class="num">now</th><th scope="col">utilisation</th><th scope="col">now governs</th><th scope="col">verdict</th><th scope="col">changed input</th></tr></thead><tbody>${joined(rows)}</tbody></table></div>`}</section>`
}
