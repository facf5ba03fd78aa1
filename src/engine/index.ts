/** The engine's only door. */
export { assess } from './assessment/assess.ts'
export { type Answer, calculateBlock, calculateGroup, calculateSettlement, calculateSinglePile } from './calculators.ts'
export { methodCards } from './catalogue.ts'
export { EngineFault } from './faults.ts'
export { baseMethods, shaftMethods } from './methods/registry.ts'
export { bibliography } from './sources/bibliography.ts'
export { sliceTrace } from './trace/slice.ts'
export { engineVersion } from './version.ts'
