import type { ElasticLayer } from '../../src/engine/settlement/continuum/elastic-profile.ts'
import { interactionCurve } from '../../src/engine/settlement/continuum/interaction-curve.ts'
import { solvePile } from '../../src/engine/settlement/continuum/single-pile.ts'

/** Run as a process of its own: nothing is compiled yet. Prints the milliseconds of a pile and of its interaction curve. */
const homogeneous = process.argv[2] === 'homogeneous'
const moduli = homogeneous ? [30e3] : [6e3, 30e3, 12e3, 45e3, 70e3]
const layers = moduli.map((E, i): ElasticLayer => {
  const top = 4 * i
  const bottom = i === moduli.length - 1 ? Number.POSITIVE_INFINITY : top + 4
  return { top, bottom, E: { top: E, bottom: E }, nu: i % 2 === 0 ? 0.5 : 0.3 }
})
const before = process.cpuUsage()
const start = performance.now()
const pile = solvePile(
  { head: 0, toe: 20, radius: 0.4, baseRadius: 0.4, axialStiffness: 30e6 * Math.PI * 0.16 },
  { layers, rigidBase: false },
)
const between = performance.now()
const curve = interactionCurve(pile, 30)
const end = performance.now()
const { user, system } = process.cpuUsage(before)
process.stdout.write(
  JSON.stringify({ pile: between - start, curve: end - between, cpu: (user + system) / 1e3, alpha: curve.at(2.4) }),
)
