import type { DesignBasis } from '../design-basis/design-basis.ts'
import type { GroundProfile } from '../ground/profile-types.ts'
import type { MethodChoices } from '../methods/method-choice.ts'
import type { Notice } from '../notice.ts'
import type { Layout } from '../piles/layout.ts'
import type { PileType } from '../piles/pile-type.ts'

/** JSON Pointers of the parts of a job in the request that brought them. */
export type Places = {
  readonly pile: string
  readonly ground: string
  readonly layout: string
  readonly methods: string
  readonly designBasis: string
}

/** What a resistance is computed from. */
export type ResistanceJob = {
  readonly pile: PileType
  readonly ground: GroundProfile
  readonly methods: MethodChoices
  readonly direction: 'compression' | 'uplift'
  readonly designBasis?: DesignBasis
  readonly at: Places
  readonly notice: (notice: Notice) => void
}
export type GroupJob = ResistanceJob & { readonly layout: Layout }

/** Places of a calculator's request. */
export const calculatorPlaces: Places = {
  pile: '/pile',
  ground: '/ground',
  layout: '/layout',
  methods: '/methods',
  designBasis: '/designBasis',
}
