/** Where the pages of a stored assessment stand, for the links between them. */
export const sheetAt = (id: string, mark: string): string =>
  `/v1/assessments/${id}/caps/${encodeURIComponent(mark)}/sheet`
export const overviewAt = (id: string): string => `/v1/assessments/${id}/sheet`
export const pilesAt = (id: string): string => `/v1/assessments/${id}/piles`
export const pilesCsvAt = (id: string): string => `/v1/assessments/${id}/piles.csv`

/** A page asked with parameters; those that are undefined are left out. */
export function asked(path: string, parameters: Readonly<Record<string, string | undefined>>): string {
  const query = new URLSearchParams(
    Object.entries(parameters).flatMap(([name, value]) => (value === undefined ? [] : [[name, value]])),
  )
  return query.size === 0 ? path : `${path}?${query}`
}
