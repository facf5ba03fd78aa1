/** Text that is markup already. Only this module makes it, so that all else is escaped. */
export class Markup {
  readonly text: string
  constructor(text: string) {
    this.text = text
  }
  toString(): string {
    return this.text
  }
}

type Child = Markup | string | number | false | undefined | readonly Child[]

const ENTITIES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
}
const escaped = (text: string): string => text.replace(/[&<>"']/g, (c) => ENTITIES[c]!)

function written(child: Child): string {
  if (child instanceof Markup) return child.text
  if (typeof child === 'string') return escaped(child)
  if (typeof child === 'number') return String(child)
  if (child === false || child === undefined) return ''
  let out = ''
  for (const part of child) out += written(part)
  return out
}

/** Markup from a template: what is put in is text, unless it is markup itself. `false` and `undefined` leave nothing. */
export function html(parts: TemplateStringsArray, ...children: readonly Child[]): Markup {
  let out = parts[0]!
  for (let i = 0; i < children.length; i++) out += written(children[i]) + parts[i + 1]!
  return new Markup(out)
}

/** Markup made by our own typesetter, taken as it is. Never for what came with a request. */
export const trusted = (text: string): Markup => new Markup(text)

/** Parts in a row. */
export const joined = (parts: readonly Child[]): Markup => new Markup(written(parts))
