import { html, type Markup, trusted } from '../markup.ts'

/**
 * The sign of a utilisation: a stack of five courses of dead weight. The lower four stand for a quarter of the resistance each and
 * are laid as far as the demand reaches; the fifth lies on top, crossed, when the demand exceeds the resistance.
 */
export function coursesPath(
  utilisation: number,
  x: number,
  y: number,
  width: number,
  course: number,
): { laid: string; frame: string; cross: string } {
  const step = course + 1
  const laid: string[] = []
  const frame: string[] = []
  for (let i = 0; i < 4; i++) {
    const top = tenth(y - (i + 1) * step)
    frame.push(`M${tenth(x)} ${top}h${width}v${course}h${-width}z`)
    const share = Math.min(1, Math.max(0, utilisation * 4 - i))
    if (share > 0) laid.push(`M${tenth(x)} ${top}h${tenth(width * share)}v${course}H${tenth(x)}z`)
  }
  const top = tenth(y - 5 * step - 1)
  const cross =
    utilisation > 1
      ? `M${tenth(x - 2)} ${top}h${width + 4}v${course}h${-width - 4}zM${tenth(x - 2)} ${top}l${width + 4} ${course}m0 ${-course}l${-width - 4} ${course}`
      : ''
  return { laid: laid.join(''), frame: frame.join(''), cross }
}

const tenth = (n: number) => Math.round(n * 10) / 10

/** The same for a cell of a table. The number stands beside it. */
export function courses(utilisation: number): Markup {
  const { laid, frame, cross } = coursesPath(utilisation, 3, 21, 20, 3)
  return trusted(
    `<svg class="courses" viewBox="0 0 26 23" width="26" height="23" aria-hidden="true"><path class="laid" d="${laid}"/><path class="frame" d="${frame}"/>${cross && `<path class="over" d="${cross}"/>`}</svg>`,
  )
}

export const verdictWord = (satisfied: boolean): Markup =>
  satisfied ? html`<span class="holds">holds</span>` : html`<strong class="exceeds">exceeded</strong>`
