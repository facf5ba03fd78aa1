/** The engine's only door. */
export { type Answer, calculateBlock, calculateGroup, calculateSinglePile } from './calculators.ts'
export { methodCards } from './catalogue.ts'
export { bibliography } from './sources/bibliography.ts'
