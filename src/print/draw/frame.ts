import { html, type Markup } from '../markup.ts'

/** Fills of the soils: they differ in pattern, so that they read in black and white. */
export const patterns = (id: string): Markup => html`<defs>
<pattern id="${id}-cohesive" width="14" height="7" patternUnits="userSpaceOnUse"><path class="hatch" d="M0 2h8M7 5.5h7"/></pattern>
<pattern id="${id}-granular" width="8" height="8" patternUnits="userSpaceOnUse"><circle class="dot" cx="2" cy="2" r=".9"/><circle class="dot" cx="6" cy="6" r=".7"/></pattern>
<pattern id="${id}-rock" width="16" height="12" patternUnits="userSpaceOnUse"><path class="hatch" d="M0 .5h16M0 6.5h16M4 .5v6M12 6.5v6"/></pattern>
<pattern id="${id}-pile" width="5" height="5" patternUnits="userSpaceOnUse" patternTransform="rotate(45)"><path class="hatch" d="M0 0v5"/></pattern>
<marker id="${id}-end" viewBox="0 0 8 8" refX="4" refY="4" markerWidth="7" markerHeight="7" orient="auto"><path class="tickmark" d="M1 7L7 1"/></marker>
</defs>`

/** A drawing with its caption; what it shows is told in words to those who cannot see it. */
export function figureOf(
  at: {
    readonly id: string
    readonly width: number
    readonly height: number
    readonly title: string
    readonly description: string
  },
  content: Markup,
): Markup {
  return html`<figure><div class="wide" tabindex="0" role="region" aria-label="${at.title}"><svg class="drawing" viewBox="0 0 ${round(at.width)} ${round(at.height)}" width="${round(at.width)}" height="${round(at.height)}" role="img" aria-labelledby="${at.id}-t ${at.id}-d"><title id="${at.id}-t">${at.title}</title><desc id="${at.id}-d">${at.description}</desc>${content}</svg></div><figcaption>${at.title}. ${at.description}</figcaption></figure>
`
}

/** Coordinates of a drawing, to a tenth of a unit. */
export const round = (n: number): number => Math.round(n * 10) / 10
