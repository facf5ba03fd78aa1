import { Problem, type ProblemError, problemError, problemOf } from '../errors.ts'

type Level = { readonly names: Set<string> | undefined; at: string | number }

const TOKEN = /"(?:[^"\\]|\\.)*"|[{}[\],:]/g
const escapeName = (name: string) => name.replaceAll('~', '~0').replaceAll('/', '~1')
const nameOf = (token: string) => (token.includes('\\') ? (JSON.parse(token) as string) : token.slice(1, -1))

/** Names that stand twice in one object of a text that is JSON. Without recursion: it may be nested a million deep. */
function twice(text: string): ProblemError[] {
  const errors: ProblemError[] = []
  const levels: Level[] = []
  /** The last string: a name, where a colon follows. */
  let string = ''
  for (const [token] of text.matchAll(TOKEN)) {
    const level = levels.at(-1)
    if (token === '{') levels.push({ names: new Set(), at: '' })
    else if (token === '[') levels.push({ names: undefined, at: 0 })
    else if (token === '}' || token === ']') levels.pop()
    else if (token === ':' && level?.names) {
      const name = nameOf(string)
      level.at = name
      if (level.names.has(name)) {
        const pointer = levels.map(({ at }) => `/${escapeName(String(at))}`).join('')
        errors.push(problemError(pointer, 'duplicate-field', { field: name }))
      }
      level.names.add(name)
    } else if (token === ',' && typeof level?.at === 'number') level.at++
    else string = token
  }
  return errors
}

/**
 * Reads JSON. A name that stands twice is refused: which of the two holds would be a guess, and other readers of the same text
 * may guess otherwise. Throws `malformed-json`, or one problem with every such name.
 */
export function readJson(text: string): unknown {
  let value: unknown
  try {
    value = JSON.parse(text)
  } catch (fault) {
    throw new Problem('malformed-json', { reason: text === '' ? 'the body is empty' : (fault as Error).message })
  }
  const errors = twice(text)
  if (errors.length > 0) throw problemOf(errors)
  return value
}
