import type { Installation } from '../piles/pile-type.ts'

export type MethodRole = 'cohesiveShaft' | 'cohesiveBase' | 'granularShaft' | 'granularBase'

/** The method that is used where a request names none, and why. */
export function defaultMethod(
  role: MethodRole,
  installation: Installation,
): { readonly id: string; readonly reason: string } {
  switch (role) {
    case 'cohesiveShaft':
      return installation === 'driven'
        ? { id: 'rp2geo-2011', reason: 'Default for driven piles in cohesive soil.' }
        : { id: 'oneill-reese-1999', reason: 'Default for bored and continuous flight auger piles in cohesive soil.' }
    case 'cohesiveBase':
      return { id: 'skempton-1951', reason: 'Default for bases in cohesive soil.' }
    case 'granularShaft':
      return { id: 'beta-effective-stress', reason: 'Default for shafts in granular soil.' }
    case 'granularBase':
      return { id: 'navfac-1986', reason: 'Default for bases in granular soil.' }
  }
}
