import {
  type DocumentNode,
  type FieldNode,
  type GraphQLNamedType,
  type GraphQLSchema,
  getNamedType,
  getNullableType,
  isListType,
  Kind,
  type OperationDefinitionNode,
  type SelectionSetNode,
} from 'graphql'
import { DEFAULT_FIRST } from './connection.ts'
import { fieldCosts, LIST, listSizes } from './limits.ts'

type Variables = Readonly<Record<string, unknown>>

/** Rows that `first` asks for. A variable that is not known yet counts one: the cost is told again when it is. */
function firstOf(node: FieldNode, variables: Variables | undefined): number {
  const value = node.arguments?.find((argument) => argument.name.value === 'first')?.value
  if (value?.kind === Kind.INT) return Number(value.value)
  if (value?.kind !== Kind.VARIABLE) return DEFAULT_FIRST
  if (variables === undefined) return 1
  const given = variables[value.name.value]
  return typeof given === 'number' ? given : DEFAULT_FIRST
}

/**
 * What an operation costs: one for each object of its answer, as many as its lists may hold, and more for what takes long to
 * compute. Fragments are counted wherever they are spread.
 */
export function costOf(
  schema: GraphQLSchema,
  document: DocumentNode,
  operation: OperationDefinitionNode,
  variables?: Variables,
): number {
  const fragments = new Map(
    document.definitions.flatMap((d) => (d.kind === Kind.FRAGMENT_DEFINITION ? [[d.name.value, d] as const] : [])),
  )
  const known = new Map<string, number>()
  const open = new Set<string>()
  const fieldsOf = (type: GraphQLNamedType | undefined) => (type && 'getFields' in type ? type.getFields() : {})

  function ofField(node: FieldNode, type: GraphQLNamedType | undefined, rows: number | undefined): number {
    const name = node.name.value
    const field = fieldsOf(type)[name]
    if (!field) return 0
    const own = fieldCosts[`${type!.name}.${name}`]
    if (!node.selectionSet) return own ?? 0
    const pages = 'args' in field && field.args.some((argument) => argument.name === 'first')
    const inner = ofSet(node.selectionSet, getNamedType(field.type), pages ? firstOf(node, variables) : undefined)
    const isList = isListType(getNullableType(field.type))
    const size = isList ? (rows ?? listSizes[`${type!.name}.${name}`] ?? LIST) : 1
    return size * ((own ?? 1) + inner)
  }
  function ofFragment(name: string, rows: number | undefined): number {
    const fragment = fragments.get(name)
    const key = `${name} ${rows}`
    // A fragment that spreads itself is refused by another rule; here it must only end.
    if (!fragment || open.has(name)) return 0
    let cost = known.get(key)
    if (cost === undefined) {
      open.add(name)
      cost = ofSet(fragment.selectionSet, schema.getType(fragment.typeCondition.name.value), rows)
      open.delete(name)
      known.set(key, cost)
    }
    return cost
  }
  function ofSet(set: SelectionSetNode, type: GraphQLNamedType | undefined, rows: number | undefined): number {
    let cost = 0
    for (const node of set.selections) {
      if (node.kind === Kind.FIELD) cost += ofField(node, type, rows)
      else if (node.kind === Kind.FRAGMENT_SPREAD) cost += ofFragment(node.name.value, rows)
      else {
        const narrowed = node.typeCondition ? schema.getType(node.typeCondition.name.value) : type
        cost += ofSet(node.selectionSet, narrowed, rows)
      }
    }
    return cost
  }
  return ofSet(operation.selectionSet, schema.getRootType(operation.operation) ?? undefined, undefined)
}
