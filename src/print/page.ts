import { createHash } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { html, type Markup, trusted } from './markup.ts'

/** Blank lines and indents of the style sheet are not sent. The file holds no comment within a rule. */
const style = readFileSync(new URL('paper.css', import.meta.url), 'utf8')
  .replace(/\n\s*/g, '\n')
  .trim()
const styleHash = createHash('sha256').update(style).digest('base64')

/**
 * What a page may load: its own style, by hash, so that a saved page stays whole; scripts of this service, which only pages
 * with `script` name; nothing else, from nowhere.
 */
export const pagePolicy: string = [
  "default-src 'none'",
  `style-src 'sha256-${styleHash}'`,
  "script-src 'self'",
  "base-uri 'none'",
  "form-action 'none'",
  "frame-ancestors 'none'",
].join('; ')

export type Page = {
  readonly title: string
  readonly strip: Markup
  readonly body: Markup
  readonly script?: string
  readonly wide?: boolean
}

/** A whole document. On paper the strip is the head of a table, which browsers repeat on each sheet. */
export function page({ title, strip, body, script, wide }: Page): string {
  return html`<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1"><title>${title}</title><style>${trusted(style)}</style>${script && html`<script src="${script}" defer></script>`}</head>
<body${wide && trusted(' class="broad"')}><table class="paper" role="presentation"><thead><tr><td>${strip}</td></tr></thead><tbody><tr><td>
${body}
</td></tr></tbody></table></body></html>
`.text
}
