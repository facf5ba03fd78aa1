import type { StrengthCheck } from './strength-check.ts'

/** The pull on the cap against the sum of the piles in uplift; only where the cap is pulled. */
export const groupUplift: StrengthCheck = {
  kind: 'group-uplift',
  demand: ({ load }) => (load.V < 0 ? { value: -load.V, pulled: true } : undefined),
  resistance: ({ set }) => set.uplift().piles,
}
