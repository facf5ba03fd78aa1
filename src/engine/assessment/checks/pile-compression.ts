import type { StrengthCheck } from './strength-check.ts'

/** The most loaded pile against the resistance of one pile. */
export const pileCompression: StrengthCheck = {
  kind: 'pile-compression',
  demand: ({ most }) => ({ value: Math.max(0, most.load), pile: most.pile, pulled: false }),
  resistance: ({ set }) => set.compression.pile,
}
