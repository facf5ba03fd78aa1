/** Which methods a request asks for. Left out: the default for the soil and installation. */

export type CohesiveShaftId =
  | 'rp2geo-2011'
  | 'rp2a-1984'
  | 'randolph-murphy-1985'
  | 'kolk-van-der-velde-1996'
  | 'skempton-1959'
  | 'oneill-reese-1999'
  | 'gec10-2018'
  | 'burland-1973'
  | 'specified-alpha'
export type CohesiveBaseId = 'skempton-1951' | 'linear-depth' | 'nhi-2006' | 'oneill-reese-1999' | 'specified-nc'
export type GranularShaftId =
  | 'beta-effective-stress'
  | 'navfac-1986'
  | 'rp2geo-2011'
  | 'oneill-reese-1999'
  | 'specified-beta'
export type GranularBaseId = 'navfac-1986' | 'janbu-1976' | 'rp2geo-2011' | 'oneill-reese-1999'

/** A method by id, or with parameters of its own. */
export type Chosen<Id extends string> = Id | ({ readonly method: Id } & Readonly<Record<string, number | string>>)

export type MethodChoices = {
  readonly cohesiveShaft?: Chosen<CohesiveShaftId>
  readonly cohesiveBase?: Chosen<CohesiveBaseId>
  readonly granularShaft?: Chosen<GranularShaftId>
  readonly granularBase?: Chosen<GranularBaseId>
  readonly upliftRatio?: { readonly cohesive?: number; readonly granular?: number }
  /** Largest sublayer of the shaft sum, m. Default 1. */
  readonly sublayer?: number
}
