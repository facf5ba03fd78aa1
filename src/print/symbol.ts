import { html, joined, type Markup } from './markup.ts'

const GREEK: Readonly<Record<string, string>> = {
  alpha: 'α',
  beta: 'β',
  gamma: 'γ',
  delta: 'δ',
  epsilon: 'ε',
  zeta: 'ζ',
  eta: 'η',
  theta: 'θ',
  kappa: 'κ',
  lambda: 'λ',
  mu: 'μ',
  nu: 'ν',
  xi: 'ξ',
  pi: 'π',
  rho: 'ρ',
  sigma: 'σ',
  tau: 'τ',
  phi: 'φ',
  chi: 'χ',
  psi: 'ψ',
  omega: 'ω',
  Delta: 'Δ',
}
/** Subscripts that count or name an axis lean like variables, all others stand like words. */
const running = /^(i|j|x|y|z)$/

const made = new Map<string, Markup>()

/** A symbol in running text: `c_u` with a subscript, `sigma_v` in Greek, words upright. */
export function symbol(name: string): Markup {
  const known = made.get(name)
  if (known) return known
  const [head = '', ...below] = name.split('_')
  const letter = GREEK[head] ?? head
  const base = [...letter].length === 1 ? html`<i>${letter}</i>` : html`${letter}`
  const sub = below.map((part, i) => {
    const text = GREEK[part] ?? part
    return html`${i > 0 && ','}${running.test(part) ? html`<i>${text}</i>` : text}`
  })
  const out = html`<span class="sym">${base}${below.length > 0 && html`<sub>${joined(sub)}</sub>`}</span>`
  if (made.size < 1000) made.set(name, out)
  return out
}
