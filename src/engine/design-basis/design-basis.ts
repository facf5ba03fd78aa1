/** The format of safety of a project. */
export type En1997Approach = 'DA1-1' | 'DA1-2' | 'DA2' | 'DA3'
export type CharacteristicRoute =
  | { readonly route: 'model-factor'; readonly value: number }
  | { readonly route: 'profiles'; readonly count: number; readonly stiffStructure?: boolean }

export type OverallFactor = {
  readonly format: 'overall-factor'
  readonly factor: number
  readonly blockFactor?: number
  readonly upliftFactor?: number
  readonly split?: { readonly shaft: number; readonly base: number }
}
export type En1997 = {
  readonly format: 'en1997-1-2004'
  readonly approach: En1997Approach
  readonly characteristic: CharacteristicRoute
}
export type Custom = {
  readonly format: 'custom'
  readonly shaft: number
  readonly base: number
  readonly block: number
  readonly uplift: number
}
export type DesignBasis = OverallFactor | En1997 | Custom
