import type { StrengthCheck } from './strength-check.ts'

/** The pull on the cap against the block in uplift; only where the cap is pulled. */
export const blockUplift: StrengthCheck = {
  kind: 'block-uplift',
  demand: ({ load }) => (load.V < 0 ? { value: -load.V, pulled: true } : undefined),
  resistance: ({ set }) => set.uplift().block,
}
