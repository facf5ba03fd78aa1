import { listMethods, listSources } from '../operations/list-methods.ts'
import type { Method, Source } from './resolver-types.ts'

type Card = ReturnType<typeof listMethods>['methods'][number]

/** A method as GraphQL shows it: its parameters as a list, each with the field name that a request uses. */
const methodOf = ({ parameters, ...card }: Card): Method => ({
  ...card,
  parameters: Object.entries(parameters).map(([key, parameter]) => ({ key, ...parameter })),
})

export const methods = (): readonly Method[] => listMethods().methods.map(methodOf)
export const sources = (): readonly Source[] => listSources().sources
