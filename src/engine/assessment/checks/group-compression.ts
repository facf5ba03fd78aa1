import type { StrengthCheck } from './strength-check.ts'

/** V against the sum of the single piles. */
export const groupCompression: StrengthCheck = {
  kind: 'group-compression',
  demand: ({ load }) => (load.V >= 0 ? { value: load.V, pulled: false } : undefined),
  resistance: ({ set }) => set.compression.piles,
}
