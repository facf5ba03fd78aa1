/** A caution or warning attached to a result. */
export type Notice = {
  readonly code: NoticeCode
  readonly level: 'caution' | 'warning' | 'info'
  readonly text: string
  readonly pointer?: string
}

export type NoticeCode =
  | 'usual-cautions'
  | 'outside-range'
  | 'close-spacing'
  | 'weaker-below-toe'
  | 'negative-friction-likely'
  | 'default-used'
  | 'ground-carried-on'
  | 'base-movement-governs'
  | 'approximation'
  | 'missing-combinations'
  | 'loads-not-used'

/** The one notice that every answer carries. */
export const usualCautions: Notice = {
  code: 'usual-cautions',
  level: 'caution',
  text: 'Results rest on the given ground parameters. Local codes and the judgement of a licensed engineer govern. Load tests and site supervision are not replaced.',
}
