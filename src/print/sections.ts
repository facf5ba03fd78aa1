/** A heading of the calculation, and what of a step's id is left to tell lines under it apart. */
export type Section = { readonly key: string; readonly title: string }

const titles: readonly (readonly [pattern: RegExp, title: string])[] = [
  [/^settlement\/(pile|ground|stiffness)\//, 'Stiffness of a single pile'],
  [/^settlement\/(K_|matrix\/)/, 'Stiffness handed back to the structural model'],
  [/^settlement\/group\//, 'Stiffness of the group'],
  [/^(stiffness)\//, 'Stiffness of a single pile'],
  [/^pile\//, 'The pile'],
  [/^ground\//, 'Stress in the ground'],
  [/^methods\//, 'Methods'],
  [/^shaft\//, 'Resistance of the shaft'],
  [/^base\//, 'Resistance of the base'],
  [/^uplift\//, 'Resistance of the pile'],
  [/^R($|\/)/, 'Resistance of the pile'],
  [/^block\/base\//, 'Base of the block'],
  [/^block\/side\//, 'Sides of the block'],
  [/^block\//, 'The block of soil and piles'],
  [/^design\//, 'Margin by the design basis'],
  [/^(softening|curve)\//, 'Softening under load'],
  [/^(V|Mx|My|n|P|s|I)$/, 'Load and settlement of one pile'],
  [/^axial\//, 'Load along the pile'],
  [/^plan\//, 'The piles in plan'],
  [/^group\/(flexibility|K_)/, 'Stiffness of the group'],
  [/^group\/statics\//, 'Loads of the piles by statics'],
  [/^group\//, 'The piles together'],
  [/^caps\/[^/]+\/stiffness\//, 'Stiffness handed back to the structural model'],
  [/^caps\/[^/]+\/(settlement|tilt)\//, 'Settlement and tilt of the cap'],
  [/^caps\//, 'Loads and checks of the cap'],
  [/^neighbours\//, 'Neighbouring caps'],
  [/^summary\//, 'Summary'],
]

/** Resistances that several caps, or a settlement, rest on. */
const shared = /^resistance\/(\d+\/)?/

const made = new Map<string, Section>()

/** Resistances of a schedule are shared by caps of one kind: `resistance/<n>/` says nothing to a reader. */
export function sectionOf(id: string): Section {
  const known = made.get(id)
  if (known) return known
  const own = id.replace(shared, '')
  const title = titles.find(([pattern]) => pattern.test(own))?.[1] ?? 'The calculation'
  const section = { key: title, title }
  if (made.size < 20_000) made.set(id, section)
  return section
}

/**
 * What tells the lines of a bundle apart: the parts of their ids that differ. A first whole number under shaft, side or ground
 * counts layers and is given as the layer's name.
 */
export function lineLabels(ids: readonly (readonly string[])[], layerNames: readonly string[]): string[] {
  const parts = ids.map((same) => same.map((id) => id.replace(shared, '').split('/')))
  const all = parts.flat()
  const length = Math.min(...all.map((p) => p.length))
  const head = (i: number) => all.every((p) => p[i] === all[0]![i])
  let from = 0
  while (from < length && head(from)) from++
  const tail = (i: number) => all.every((p) => p.at(-1 - i) === all[0]!.at(-1 - i))
  let to = 0
  while (to < length - from && tail(to)) to++
  const layered = /^(block\/side|shaft|ground|stiffness)\//
  return parts.map((same) => {
    const labels = same.map((p) => {
      const own = p.slice(from, p.length - to)
      const isLayer =
        layered.test(p.join('/')) && /^\d+$/.test(own[0] ?? '') && p.slice(0, from).every((s) => !/^\d+$/.test(s))
      const name = isLayer ? layerNames[Number(own[0])] : undefined
      return (name ? [name, ...own.slice(1)] : own.map(decoded)).join(' ')
    })
    return [...new Set(labels)].join(', ')
  })
}

/** Names stand in ids as parts of JSON Pointers do. */
const decoded = (part: string): string => part.replaceAll('~1', '/').replaceAll('~0', '~')
