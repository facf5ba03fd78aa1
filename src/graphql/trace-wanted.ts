import { type GraphQLResolveInfo, Kind, type SelectionSetNode } from 'graphql'

/** Whether `trace` is selected below a calculator: only then it is recorded. A condition on it counts as selected. */
export function traceWanted(info: GraphQLResolveInfo): boolean {
  const selects = (set: SelectionSetNode | undefined): boolean =>
    set?.selections.some((node) => {
      if (node.kind === Kind.FIELD) return node.name.value === 'trace'
      return selects(
        node.kind === Kind.INLINE_FRAGMENT ? node.selectionSet : info.fragments[node.name.value]?.selectionSet,
      )
    }) ?? false
  return info.fieldNodes.some((node) => selects(node.selectionSet))
}
