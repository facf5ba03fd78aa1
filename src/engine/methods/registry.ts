import { linearDepth } from './cohesive-base/linear-depth.ts'
import { nhi2006 } from './cohesive-base/nhi-2006.ts'
import { oneillReeseBase1999 } from './cohesive-base/oneill-reese-1999.ts'
import { skempton1951 } from './cohesive-base/skempton-1951.ts'
import { specifiedNc } from './cohesive-base/specified-nc.ts'
import { burland1973 } from './cohesive-shaft/burland-1973.ts'
import { gec102018 } from './cohesive-shaft/gec10-2018.ts'
import { kolkVanDerVelde1996 } from './cohesive-shaft/kolk-van-der-velde-1996.ts'
import { oneillReese1999 } from './cohesive-shaft/oneill-reese-1999.ts'
import { randolphMurphy1985 } from './cohesive-shaft/randolph-murphy-1985.ts'
import { rp2a1984 } from './cohesive-shaft/rp2a-1984.ts'
import { rp2geo2011 } from './cohesive-shaft/rp2geo-2011.ts'
import { skempton1959 } from './cohesive-shaft/skempton-1959.ts'
import { specifiedAlpha } from './cohesive-shaft/specified-alpha.ts'
import { janbu1976 } from './granular-base/janbu-1976.ts'
import { navfacBase1986 } from './granular-base/navfac-1986.ts'
import { oneillReeseSandBase1999 } from './granular-base/oneill-reese-1999.ts'
import { rp2geoBase2011 } from './granular-base/rp2geo-2011.ts'
import { betaEffectiveStress } from './granular-shaft/beta-effective-stress.ts'
import { navfac1986 } from './granular-shaft/navfac-1986.ts'
import { oneillReeseShaft1999 } from './granular-shaft/oneill-reese-1999.ts'
import { rp2geoShaft2011 } from './granular-shaft/rp2geo-2011.ts'
import { specifiedBeta } from './granular-shaft/specified-beta.ts'
import type { BaseMethod, ShaftMethod } from './method.ts'
import type { CohesiveBaseId, CohesiveShaftId, GranularBaseId, GranularShaftId } from './method-choice.ts'

/** Every shaft method by kind and id. */
export const shaftMethods = {
  cohesiveShaft: {
    'rp2geo-2011': rp2geo2011,
    'rp2a-1984': rp2a1984,
    'randolph-murphy-1985': randolphMurphy1985,
    'kolk-van-der-velde-1996': kolkVanDerVelde1996,
    'skempton-1959': skempton1959,
    'oneill-reese-1999': oneillReese1999,
    'gec10-2018': gec102018,
    'burland-1973': burland1973,
    'specified-alpha': specifiedAlpha,
  } satisfies Record<CohesiveShaftId, ShaftMethod>,
  granularShaft: {
    'beta-effective-stress': betaEffectiveStress,
    'navfac-1986': navfac1986,
    'rp2geo-2011': rp2geoShaft2011,
    'oneill-reese-1999': oneillReeseShaft1999,
    'specified-beta': specifiedBeta,
  } satisfies Record<GranularShaftId, ShaftMethod>,
}

/** Every base method by kind and id. */
export const baseMethods = {
  cohesiveBase: {
    'skempton-1951': skempton1951,
    'linear-depth': linearDepth,
    'nhi-2006': nhi2006,
    'oneill-reese-1999': oneillReeseBase1999,
    'specified-nc': specifiedNc,
  } satisfies Record<CohesiveBaseId, BaseMethod>,
  granularBase: {
    'navfac-1986': navfacBase1986,
    'janbu-1976': janbu1976,
    'rp2geo-2011': rp2geoBase2011,
    'oneill-reese-1999': oneillReeseSandBase1999,
  } satisfies Record<GranularBaseId, BaseMethod>,
}
