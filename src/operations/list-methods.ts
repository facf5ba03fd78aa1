import { bibliography, methodCards } from '../engine/index.ts'
import { Problem } from '../errors.ts'

const card = (method: ReturnType<typeof methodCards>[number]) => ({
  ...method,
  source: bibliography[method.source as keyof typeof bibliography],
  parameters: method.parameters,
  formulas: method.formulas.map((f) => ({
    symbol: f.symbol,
    name: f.name,
    unit: f.unit,
    formula: f.text,
    operands: f.where,
    source: f.source,
    ...(f.range && { range: f.range }),
  })),
  unitShaftResistance: undefined,
  unitBaseResistance: undefined,
})

/** Every method with source, validity, needed parameters and formulas. */
export const listMethods = () => ({ methods: methodCards().map(card) })

/** The methods of one id: an id may serve shaft and base, cohesive and granular. */
export function getMethod(id: string) {
  const methods = methodCards()
    .filter((m) => m.id === id)
    .map(card)
  if (methods.length === 0) throw new Problem('not-found', { path: `/v1/methods/${id}` })
  return { id, methods }
}

export const listSources = () => ({ sources: Object.values(bibliography) })
