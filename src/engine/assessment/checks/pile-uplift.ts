import { NO_TENSION, type StrengthCheck } from './strength-check.ts'

/** The most pulled pile against the uplift resistance of one pile; only where a pile is pulled. */
export const pileUplift: StrengthCheck = {
  kind: 'pile-uplift',
  demand: ({ least }) =>
    least.load < -NO_TENSION ? { value: -least.load, pile: least.pile, pulled: true } : undefined,
  resistance: ({ set }) => set.uplift().pile,
}
