import { overviewAt, pilesCsvAt } from './addresses.ts'
import { checkWords } from './check-words.ts'
import { short } from './figure.ts'
import { html, joined } from './markup.ts'
import { page } from './page.ts'
import { pileRows } from './pile-rows.ts'
import { shortQuantity } from './quantity.ts'
import type { AssessmentRecord } from './record.ts'
import { paperStrip, titleBlock } from './title-block.ts'

/** The schedule of piles as a page. */
export function pileSchedule(record: AssessmentRecord): string {
  const rows = pileRows(record).map(
    (
      r,
    ) => html`<tr class="${r.check?.satisfied === false && 'exceeds'}"><th scope="row">${r.cap}</th><td class="num">${r.pile}</td><td>${r.type}</td><td class="num place">${millimetres(r.x)}</td><td class="num place">${millimetres(r.y)}</td><td class="num">${short(r.cutOff)}</td><td class="num">${short(r.toe)}</td>${
      r.check
        ? html`<td class="num">${shortQuantity(r.check.demand, 'kN')}</td><td class="num">${shortQuantity(r.check.resistance, 'kN')}</td><td class="num">${short(r.check.utilisation)}</td><td>${checkWords[r.check.check].name}, ${r.check.combination}</td>`
        : html`<td class="num">–</td><td class="num">–</td><td class="num">–</td><td></td>`
    }</tr>
`,
  )
  const head = (words: string, unit = '', num = false) =>
    html`<th scope="col" class="${num && 'num'}">${words}${unit && html` <span class="unit">[${unit}]</span>`}</th>`
  const subject = record.schedule.title
  return page({
    title: `${subject}, schedule of piles`,
    strip: paperStrip(record, 'Schedule of piles'),
    wide: true,
    body: html`${titleBlock(record, subject, 'Schedule of piles')}${record.id !== undefined && html`<nav class="contents" aria-label="Other pages of this record"><a class="leaves" href="${overviewAt(record.id)}">All caps</a><a class="leaves" href="${pilesCsvAt(record.id)}">The same as CSV</a></nav>`}
<main><section id="piles"><h2>Piles</h2>
<p class="rule">x and y are the place of the cap plus that of the pile in its layout. Cut-off and toe are depths below the surface of the cap's ground profile. Load, resistance and utilisation are those of the most loaded pile of the cap: all piles of a cap are built alike.</p>
<div class="wide" tabindex="0" role="region" aria-label="Piles"><table class="checks"><thead><tr>${head('cap')}${head('pile', '', true)}${head('type')}${head('x', 'm', true)}${head('y', 'm', true)}${head('cut-off', 'm', true)}${head('toe level', 'm', true)}${head('design load', '', true)}${head('resistance', '', true)}${head('utilisation', '', true)}${head('governs')}</tr></thead><tbody>
${joined(rows)}</tbody></table></div>
<p class="caution">${record.reply.notices[0]?.text}</p></section></main>`,
  })
}

const millimetres = (m: number): string => m.toFixed(3).replace('-', '−')
