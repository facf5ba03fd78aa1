/** No request of the contract is nested deeper; what lies below is refused there as it stands. */
const deepest = 32

/**
 * An argument as the REST body would hold it: fields that are null are left out (GraphQL clients send null for
 * "not given"), and objects are ordinary ones. `Object.fromEntries` keeps a field called `__proto__` a field.
 */
export function plainInput(value: unknown, depth = 0): unknown {
  if (depth > deepest || typeof value !== 'object' || value === null) return value
  if (Array.isArray(value)) return value.map((inner) => plainInput(inner, depth + 1))
  return Object.fromEntries(
    Object.entries(value)
      .filter(([, inner]) => inner !== null)
      .map(([key, inner]) => [key, plainInput(inner, depth + 1)]),
  )
}
