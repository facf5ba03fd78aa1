import { escapePointer } from '../places.ts'
import { type Demand, type LoadedCap, NO_TENSION, type StrengthCheck } from './strength-check.ts'

/** The larger of compression and pull against the section's own design resistances, by utilisation. */
function worst({ schedule, cap, most, least }: LoadedCap): Demand | undefined {
  const section = schedule.pileTypes[cap.pileType]!.sectionResistance
  const compression = section?.compression && {
    use: Math.max(0, most.load) / section.compression,
    demand: { value: Math.max(0, most.load), pile: most.pile, pulled: false },
  }
  const tension = section?.tension &&
    least.load < -NO_TENSION && {
      use: -least.load / section.tension,
      demand: { value: -least.load, pile: least.pile, pulled: true },
    }
  if (!compression || !tension) return (compression || tension || undefined)?.demand
  return (tension.use > compression.use ? tension : compression).demand
}

/** The largest pile load against `sectionResistance`, a design resistance taken as given. */
export const pileSection: StrengthCheck = {
  kind: 'pile-section',
  demand: worst,
  resistance: ({ schedule, cap }, { pulled }, sheet) => {
    const kind = pulled ? 'tension' : 'compression'
    const value = schedule.pileTypes[cap.pileType]!.sectionResistance![kind]!
    const pointer = `/pileTypes/${escapePointer(cap.pileType)}/sectionResistance/${kind}`
    return sheet.input(
      { symbol: 'R_sec', name: `design resistance of the section in ${kind}`, unit: 'kN' },
      value,
      pointer,
    )
  },
}
