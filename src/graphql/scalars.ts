import { GraphQLError, GraphQLScalarType, Kind, type ValueNode, valueFromASTUntyped } from 'graphql'

const holdsVariable = (node: ValueNode): boolean => {
  if (node.kind === Kind.LIST) return node.values.some(holdsVariable)
  if (node.kind === Kind.OBJECT) return node.fields.some((field) => holdsVariable(field.value))
  return node.kind === Kind.VARIABLE
}

/** The compiler of queries would drop a variable inside a literal of a scalar without a word: refused beforehand. */
function literal(node: ValueNode): unknown {
  if (!holdsVariable(node)) return valueFromASTUntyped(node)
  const message = 'A variable cannot stand inside a literal of this type: pass the whole value as one variable.'
  throw new GraphQLError(message, { nodes: node, extensions: { code: 'variable-in-literal' } })
}

/**
 * Scalars that let a value through as it is. The contract reads and judges it, so that a fault has the same code and
 * pointer here and on the REST route.
 */
const passing = (name: string) => {
  const same = (value: unknown) => value
  return new GraphQLScalarType({
    name,
    serialize: same,
    parseValue: same,
    parseLiteral: literal,
  })
}

export const scalars = {
  Quantity: passing('Quantity'),
  Varying: passing('Varying'),
  Count: passing('Count'),
  MethodChoice: passing('MethodChoice'),
  JSON: passing('JSON'),
}
