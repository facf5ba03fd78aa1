export type Preferences = {
  /** The client does not want to wait for the work. */
  readonly respondAsync: boolean
  /** Or at most so long, s. */
  readonly wait: number
}

/** The Prefer header (RFC 7240): of a preference that comes twice the first counts; what is not known is ignored. */
export function preferencesOf(header: string | string[] | undefined): Preferences {
  const found = new Map<string, string>()
  // Commas and semicolons inside of quotes belong to a value that nobody here asks for.
  const plain = String(header ?? '').replaceAll(/"[^"]*"/g, (quoted) =>
    /^"\d+"$/.test(quoted) ? quoted.slice(1, -1) : '',
  )
  for (const part of plain.split(',')) {
    const [name = '', value = ''] = part.split(';')[0]!.split('=')
    const key = name.trim().toLowerCase()
    if (!found.has(key)) found.set(key, value.trim())
  }
  const wait = found.get('wait') ?? ''
  return { respondAsync: found.has('respond-async'), wait: /^\d{1,9}$/.test(wait) ? Number(wait) : 0 }
}
