import { needScope, type Scope } from '../operations/rights.ts'
import type { Context } from './context.ts'

/** What a key needs for a field at the root of a query: all of some scopes, or any valid key. A test holds the table to the schema. */
export const access: Readonly<Record<string, readonly Scope[] | 'any key'>> = {
  'Query.projects': ['read'],
  'Query.project': ['read'],
  'Query.assessments': ['read'],
  'Query.assessment': ['read'],
  'Query.jobs': ['read'],
  'Query.singlePile': ['calculate'],
  'Query.block': ['calculate'],
  'Query.group': ['calculate'],
  'Query.settlement': ['calculate'],
  'Query.methods': 'any key',
  'Query.method': 'any key',
  'Query.sources': 'any key',
  'Query.limits': 'any key',
  'Subscription.assessmentProgress': ['read'],
}

/**
 * Fields that lead from one stored thing to others. All of them stay in the project of their parent, to which the actor has a
 * right, but for `changes`, which asks for the right to `since`.
 */
export const links: readonly string[] = [
  'Project.latest',
  'Project.assessments',
  'Assessment.project',
  'Assessment.previous',
  'Assessment.next',
  'Assessment.caps',
  'Assessment.cap',
  'Assessment.neighbours',
  'Assessment.signatures',
  'Assessment.changes',
  'Assessment.aggregates',
  'Cap.checks',
  'Cap.trace',
]

/** The resolvers of a root type, each behind the scopes of its field; one that nobody listed is for administrators. Throws `missing-scope`. */
export function guarded<Fields extends object>(type: string, fields: Fields): Fields {
  const behind = Object.entries(fields).map(([field, resolve]) => {
    const needed = access[`${type}.${field}`] ?? ['admin']
    if (needed === 'any key') return [field, resolve]
    return [
      field,
      (parent: unknown, args: unknown, context: Context, info: unknown) => {
        for (const scope of needed) needScope(context.actor, scope)
        return resolve(parent, args, context, info)
      },
    ]
  })
  return Object.fromEntries(behind) as Fields
}
