import type { Term } from '../trace/term.ts'

/** What a resistance belongs to, and its parts. Base resistance and weight stand where there are any. */
export type ResistancePart = {
  readonly part: 'pile-compression' | 'pile-uplift' | 'block-compression' | 'block-uplift'
  readonly shaft: Term<'kN'>
  readonly base?: Term<'kN'>
  readonly ultimate: Term<'kN'>
  readonly weight?: Term<'kN'>
}

export const isUplift = (part: ResistancePart) => part.part.endsWith('uplift')
export const isBlock = (part: ResistancePart) => part.part.startsWith('block')
