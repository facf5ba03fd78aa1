import { blockCompression } from './block-compression.ts'
import { blockUplift } from './block-uplift.ts'
import { groupCompression } from './group-compression.ts'
import { groupUplift } from './group-uplift.ts'
import { pileCompression } from './pile-compression.ts'
import { pileSection } from './pile-section.ts'
import { pileUplift } from './pile-uplift.ts'
import type { StrengthCheck } from './strength-check.ts'

/** Every check of strength, in the order of the result. */
export const strengthChecks: readonly StrengthCheck[] = [
  pileCompression,
  pileUplift,
  groupCompression,
  blockCompression,
  groupUplift,
  blockUplift,
  pileSection,
]
