import type { StrengthCheck } from './strength-check.ts'

/** V against the block of soil and piles. */
export const blockCompression: StrengthCheck = {
  kind: 'block-compression',
  demand: ({ load }) => (load.V >= 0 ? { value: load.V, pulled: false } : undefined),
  resistance: ({ set }) => set.compression.block,
}
