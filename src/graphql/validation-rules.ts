import { type ASTVisitor, GraphQLError, Kind, type SelectionSetNode, type ValidationContext } from 'graphql'
import { costOf } from './cost.ts'
import { limits } from './limits.ts'

type Tally = { readonly depth: number; readonly aliases: number }
const nothing: Tally = { depth: 0, aliases: 0 }

/** Counts a document as it will be executed: each fragment once, its tally added wherever it is spread. */
function tallies(context: ValidationContext): (set: SelectionSetNode) => Tally {
  const known = new Map<string, Tally>()
  const open = new Set<string>()
  const fragment = (name: string): Tally => {
    const definition = context.getFragment(name)
    // A fragment that spreads itself is refused by another rule; here it must only end.
    if (!definition || open.has(name)) return nothing
    let tally = known.get(name)
    if (!tally) {
      open.add(name)
      tally = count(definition.selectionSet)
      open.delete(name)
      known.set(name, tally)
    }
    return tally
  }
  const count = (set: SelectionSetNode): Tally => {
    let [depth, aliases] = [0, 0]
    for (const node of set.selections) {
      if (node.kind === Kind.FIELD) {
        aliases += node.alias ? 1 : 0
        // Introspection is deep by nature; in production it is off altogether.
        const inner = node.selectionSet && !node.name.value.startsWith('__') ? count(node.selectionSet) : nothing
        depth = Math.max(depth, 1 + inner.depth)
        aliases += inner.aliases
      } else {
        const inner = node.kind === Kind.FRAGMENT_SPREAD ? fragment(node.name.value) : count(node.selectionSet)
        depth = Math.max(depth, inner.depth)
        aliases += inner.aliases
      }
    }
    return { depth, aliases }
  }
  return count
}

const refusal = (code: string, what: string, got: number, limit: number) =>
  new GraphQLError(`${what}: ${got}, at most ${limit} are allowed.`, { extensions: { code, got, limit } })

/** The refusal of an operation of this cost; undefined where it is not above the limit. */
export const tooCostly = (cost: number): GraphQLError | undefined =>
  cost > limits.cost ? refusal('query-too-costly', 'Cost of the query', cost, limits.cost) : undefined

/** Refuses a document that is too deep, renames too much, or asks for too much at once. */
export function documentLimits(context: ValidationContext): ASTVisitor {
  const count = tallies(context)
  return {
    OperationDefinition: (node) => {
      const { depth, aliases } = count(node.selectionSet)
      if (depth > limits.depth)
        context.reportError(refusal('query-too-deep', 'Depth of the query', depth, limits.depth))
      if (aliases > limits.aliases)
        context.reportError(refusal('too-many-aliases', 'Aliases in the query', aliases, limits.aliases))
      const costly = tooCostly(costOf(context.getSchema(), context.getDocument(), node))
      if (costly) context.reportError(costly)
      return false
    },
  }
}

/** Refuses to tell the schema; `__typename` stays. */
export function noIntrospection(context: ValidationContext): ASTVisitor {
  return {
    Field: ({ name: { value: name } }) => {
      if (name !== '__schema' && name !== '__type') return
      context.reportError(new GraphQLError('Introspection is off.', { extensions: { code: 'introspection-off' } }))
    },
  }
}
