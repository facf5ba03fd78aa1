import type { Citation, Source } from './source.ts'

/** The bibliography: every source that a formula, table or default cites. */
export const bibliography = {
  practice: {
    key: 'practice',
    title: 'Common practice of foundation design, no single source',
    author: 'trade',
    year: null,
    basis: 'common practice',
  },
  statics: { key: 'statics', title: 'Statics and geometry', author: 'identity', year: null, basis: 'common practice' },
  'api-rp2geo-2011': {
    key: 'api-rp2geo-2011',
    title: 'API RP 2GEO, Geotechnical and Foundation Design Considerations',
    author: 'American Petroleum Institute',
    year: 2011,
    basis: 'memory',
  },
  'api-rp2a-1984': {
    key: 'api-rp2a-1984',
    title: 'API RP 2A, Planning, Designing and Constructing Fixed Offshore Platforms, editions of the 1980s',
    author: 'American Petroleum Institute',
    year: 1984,
    basis: 'memory',
  },
  'randolph-murphy-1985': {
    key: 'randolph-murphy-1985',
    title: 'Shaft capacity of driven piles in clay, OTC 4883',
    author: 'Randolph, M. F.; Murphy, B. S.',
    year: 1985,
    basis: 'published',
  },
  'kolk-van-der-velde-1996': {
    key: 'kolk-van-der-velde-1996',
    title: 'A reliable method to determine friction capacity of piles driven into clays, OTC 7993',
    author: 'Kolk, H. J.; van der Velde, E.',
    year: 1996,
    basis: 'memory',
  },
  'skempton-1951': {
    key: 'skempton-1951',
    title: 'The bearing capacity of clays, Building Research Congress',
    author: 'Skempton, A. W.',
    year: 1951,
    basis: 'memory',
  },
  'skempton-1959': {
    key: 'skempton-1959',
    title: 'Cast in-situ bored piles in London clay, Géotechnique 9(4)',
    author: 'Skempton, A. W.',
    year: 1959,
    basis: 'published',
  },
  'burland-1973': {
    key: 'burland-1973',
    title: 'Shaft friction of piles in clay: a simple fundamental approach, Ground Engineering 6(3)',
    author: 'Burland, J. B.',
    year: 1973,
    basis: 'published',
  },
  'fhwa-if-99-025': {
    key: 'fhwa-if-99-025',
    title: 'Drilled Shafts: Construction Procedures and Design Methods, FHWA-IF-99-025',
    author: "O'Neill, M. W.; Reese, L. C.",
    year: 1999,
    basis: 'memory',
  },
  'fhwa-nhi-18-024': {
    key: 'fhwa-nhi-18-024',
    title: 'Drilled Shafts: Construction Procedures and Design Methods, GEC 10, FHWA-NHI-18-024',
    author: 'Federal Highway Administration',
    year: 2018,
    basis: 'memory',
  },
  'fhwa-nhi-05-042': {
    key: 'fhwa-nhi-05-042',
    title: 'Design and Construction of Driven Pile Foundations, FHWA NHI-05-042',
    author: 'Federal Highway Administration',
    year: 2006,
    basis: 'published',
  },
  'navfac-dm-7-02': {
    key: 'navfac-dm-7-02',
    title: 'Foundations and Earth Structures, NAVFAC DM 7.02',
    author: 'Naval Facilities Engineering Command',
    year: 1986,
    basis: 'memory',
  },
  'janbu-1976': {
    key: 'janbu-1976',
    title: 'Static bearing capacity of friction piles, 6th ECSMFE',
    author: 'Janbu, N.',
    year: 1976,
    basis: 'published',
  },
  'en-1997-1-2004': {
    key: 'en-1997-1-2004',
    title: 'EN 1997-1, Geotechnical design, Part 1: General rules',
    author: 'CEN',
    year: 2004,
    basis: 'published',
  },
  'randolph-wroth-1978': {
    key: 'randolph-wroth-1978',
    title:
      'Analysis of deformation of vertically loaded piles, Journal of the Geotechnical Engineering Division 104(GT12)',
    author: 'Randolph, M. F.; Wroth, C. P.',
    year: 1978,
    basis: 'memory',
  },
  'mindlin-1936': {
    key: 'mindlin-1936',
    title: 'Force at a point in the interior of a semi-infinite solid, Physics 7(5)',
    author: 'Mindlin, R. D.',
    year: 1936,
    basis: 'memory',
  },
  'poulos-davis-1980': {
    key: 'poulos-davis-1980',
    title: 'Pile Foundation Analysis and Design',
    author: 'Poulos, H. G.; Davis, E. H.',
    year: 1980,
    basis: 'memory',
  },
  'fleming-1992': {
    key: 'fleming-1992',
    title: 'A new method for single pile settlement prediction and analysis, Geotechnique 42(3)',
    author: 'Fleming, W. G. K.',
    year: 1992,
    basis: 'memory',
  },
} as const satisfies Record<string, Source>

export type SourceKey = keyof typeof bibliography

/** A citation of a place in a source of the bibliography. */
export const cite = (key: SourceKey, locator: string): Citation => ({ key, locator })

export const practice = (locator: string): Citation => cite('practice', locator)
export const statics = (locator: string): Citation => cite('statics', locator)
