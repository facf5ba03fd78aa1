import type { Notice } from '../engine/notice.ts'
import type { Trace } from '../engine/trace/step.ts'
import { givenTable } from './given.ts'
import { lineBlock } from './line-blocks.ts'
import { type Lines, linesOf } from './lines.ts'
import { html, joined, type Markup } from './markup.ts'
import { page } from './page.ts'
import type { Issue } from './record.ts'
import { paperStrip, titleBlock } from './title-block.ts'

export type SheetParts = {
  readonly issue: Issue
  readonly kind: string
  readonly subject: string
  /** Other pages of the same record, with their names. */
  readonly links?: readonly (readonly [href: string, words: string])[]
  readonly question: Markup
  readonly verdict: (lines: Lines) => Markup
  /** Plain words about what is given that is no number: names of ground and pile, methods. */
  readonly given: Markup
  readonly drawings: readonly Markup[]
  readonly notices: readonly Notice[]
  readonly trace: Trace
  readonly layerNames: readonly string[]
}

/** The stated rule of rounding (target 37). The test of printed lines holds the service to it. */
export const roundingRule =
  'Numbers are printed with seven figures, fewer where they are exact in fewer; those set small are guard figures. A line computed again from its operands as they are printed gives the printed result within half a unit of its fourth figure; where operands cancel, within what half a unit of their last printed figures makes of it. Verdict and drawings show four figures.'

/** A calculation sheet: the verdict first, then what it rests on, in the order in which a checker follows it. */
export function sheetPage(sheet: SheetParts): string {
  const lines = linesOf(sheet.trace)
  const [caution, ...notices] = sheet.notices
  const body = html`${titleBlock(sheet.issue, sheet.subject, sheet.kind)}
<nav class="contents" aria-label="Parts of this sheet"><a href="#verdict">Verdict</a><a href="#given">Given</a><a href="#drawings">Drawings</a><a href="#lines">Calculation</a><a href="#sources">Sources</a>${sheet.links?.map(([href, words]) => html`<a class="leaves" href="${href}">${words}</a>`)}</nav>
<main>
<section id="verdict" class="verdict"><h2>Question and verdict</h2><p class="question">${sheet.question}</p>${sheet.verdict(lines)}
${notices.length > 0 && html`<h3>To be noticed</h3><ul class="notices">${joined(notices.map(noticeItem))}</ul>`}
${caution && html`<p class="caution">${caution.text}</p>`}</section>
<section id="given"><h2>Given</h2>${sheet.given}${givenTable(lines)}</section>
<section id="drawings"><h2>Drawings</h2>${joined(sheet.drawings)}</section>
<section id="lines"><h2>Calculation</h2><p class="rule">${roundingRule} A raised number names the line that an operand comes from.</p>
${calculation(lines, sheet.layerNames)}</section>
<section id="sources"><h2>Sources</h2>${sources(sheet.trace)}</section>
</main>`
  return page({ title: `${sheet.subject}, ${sheet.kind}`, strip: paperStrip(sheet.issue, sheet.subject), body })
}

function calculation(lines: Lines, layerNames: readonly string[]): Markup {
  let heading = ''
  const seen = new Set<string>()
  return joined(
    lines.groups.map((group) => {
      const isNew = group.section.key !== heading
      heading = group.section.key
      const title = seen.has(heading) ? `${group.section.title}, continued` : group.section.title
      seen.add(heading)
      return html`${
        isNew &&
        html`<h3>${title}</h3>
`
      }${lineBlock(group, lines, layerNames)}`
    }),
  )
}

const noticeItem = (n: Notice): Markup =>
  html`<li class="${n.level}"><b>${n.level}</b> ${n.text}${n.pointer && html` <code>${n.pointer}</code>`}</li>`

function sources(trace: Trace): Markup {
  const items = trace.sources.map(
    (s) =>
      html`<li id="source-${s.key}"><b>${s.key}</b> ${s.author}: ${s.title}${s.year !== null && html`, ${s.year}`}. <span class="basis">${s.basis === 'memory' ? 'written down from memory of it: check against a copy' : s.basis}</span></li>
`,
  )
  return html`<ul class="sources">${joined(items)}</ul>`
}
