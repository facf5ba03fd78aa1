import { type ASTVisitor, GraphQLError, Kind, type SelectionSetNode, type ValidationContext } from 'graphql'
import { limits, rootCosts } from './limits.ts'

type Tally = { readonly depth: number; readonly aliases: number; readonly cost: number }
const nothing: Tally = { depth: 0, aliases: 0, cost: 0 }

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
    let [depth, aliases, cost] = [0, 0, 0]
    for (const node of set.selections) {
      if (node.kind === Kind.FIELD) {
        aliases += node.alias ? 1 : 0
        cost += rootCosts[node.name.value] ?? 1
        // Introspection is deep by nature; in production it is off altogether.
        const inner = node.selectionSet && !node.name.value.startsWith('__') ? count(node.selectionSet) : nothing
        depth = Math.max(depth, 1 + inner.depth)
        aliases += inner.aliases
      } else {
        const inner = node.kind === Kind.FRAGMENT_SPREAD ? fragment(node.name.value) : count(node.selectionSet)
        depth = Math.max(depth, inner.depth)
        aliases += inner.aliases
        cost += inner.cost
      }
    }
    return { depth, aliases, cost }
  }
  return count
}

const refusal = (code: string, what: string, got: number, limit: number) =>
  new GraphQLError(`${what}: ${got}, at most ${limit} are allowed.`, { extensions: { code, got, limit } })

/** Refuses a document that is too deep, renames too much, or asks for too much at once. */
export function documentLimits(context: ValidationContext): ASTVisitor {
  const count = tallies(context)
  return {
    OperationDefinition: (node) => {
      const { depth, aliases, cost } = count(node.selectionSet)
      if (depth > limits.depth)
        context.reportError(refusal('query-too-deep', 'Depth of the query', depth, limits.depth))
      if (aliases > limits.aliases)
        context.reportError(refusal('too-many-aliases', 'Aliases in the query', aliases, limits.aliases))
      if (cost > limits.cost) context.reportError(refusal('query-too-costly', 'Cost of the query', cost, limits.cost))
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
