import { type GraphQLError, type GraphQLFormattedError, Kind, type TypeNode } from 'graphql'
import { Problem } from '../errors.ts'
import { judges } from './calculators.ts'
import { formatProblem } from './error-format.ts'
import { plainInput } from './plain-input.ts'

const typeName = (type: TypeNode): string => (type.kind === Kind.NAMED_TYPE ? type.name.value : typeName(type.type))

/**
 * When a request variable does not fit its input type, the contract tells the faults: all at once, with the codes and
 * pointers of the REST route. Undefined where the errors have another cause, or the contract sees no fault.
 */
export function judgeVariables(
  errors: readonly Error[],
  variables: Readonly<Record<string, unknown>>,
): GraphQLFormattedError[] | undefined {
  const told = new Map<string, GraphQLFormattedError>()
  for (const error of errors) {
    const node = (error as Partial<GraphQLError>).nodes?.[0]
    if (node?.kind !== Kind.VARIABLE_DEFINITION) return undefined
    const name = node.variable.name.value
    const judge = judges[typeName(node.type)]
    if (!judge) return undefined
    if (told.has(name)) continue
    try {
      judge(plainInput(variables[name] ?? {}), { trace: false })
      return undefined
    } catch (problem) {
      if (!(problem instanceof Problem) || problem.status >= 500) return undefined
      told.set(name, formatProblem(problem))
    }
  }
  return told.size > 0 ? [...told.values()] : undefined
}
