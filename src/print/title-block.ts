import { html, type Markup } from './markup.ts'
import type { Issue } from './record.ts'

const roles = [
  ['originator', 'computed'],
  ['checker', 'checked'],
  ['approver', 'approved'],
] as const

const when = (time: string | undefined) =>
  time && html`<time datetime="${time}">${time.slice(0, 16).replace('T', ' ')} UTC</time>`

/** Who answers for the page, for what, and which record it is of. Lines for signatures stay open on paper until somebody signs. */
export function titleBlock(issue: Issue, subject: string, what: string): Markup {
  const signed = roles.map(([role, word]) => {
    const signature = issue.signatures.find((s) => s.role === role)
    return html`<div><dt>${word}</dt><dd>${signature ? html`${signature.actor} ${when(signature.signedAt)}` : html`<span class="open">not signed</span>`}</dd></div>`
  })
  return html`<header class="title">
<p class="kicker">${what}</p>
<h1>${subject}</h1>
<dl class="issue">
<div><dt>project</dt><dd>${issue.project ? html`${issue.project.title} <span class="slug">${issue.project.slug}</span>` : 'none: a what-if answer, not stored'}</dd></div>
<div><dt>revision</dt><dd>${issue.revision === undefined ? '–' : html`${issue.revision}`}${issue.createdAt && html` of ${when(issue.createdAt)}`}${issue.actor && html`, by ${issue.actor}`}</dd></div>
<div><dt>engine</dt><dd>${issue.engine}</dd></div>
${signed}
<div class="hash"><dt>${issue.recordHash ? 'content' : 'request'}</dt><dd><code>${issue.contentHash}</code></dd></div>
${issue.recordHash && html`<div class="hash"><dt>record</dt><dd><code>${issue.recordHash}</code></dd></div>`}
</dl>
</header>
`
}

/** The strip that stands at the head of every sheet of paper. */
export const paperStrip = (issue: Issue, subject: string): Markup =>
  html`<p class="strip"><span>${issue.project ? html`${issue.project.title}${issue.revision !== undefined && html`, revision ${issue.revision}`}` : 'what-if answer, not stored'}</span><span>${subject}</span><span><code>${(issue.recordHash ?? issue.contentHash).slice(0, 19)}…</code></span></p>`
