import DataLoader from 'dataloader'
import type { Office } from '../operations/office.ts'
import * as many from '../operations/read-many.ts'

/** Keys of one call of the store: the terms of its condition stay few enough for either database. */
const MOST_KEYS = 200

/** One call for all the keys that a step of a query asks for. */
const single = <Key, Value>(load: (keys: readonly Key[]) => Promise<readonly Value[]>) =>
  new DataLoader<Key, Value, string>(load, { cacheKeyFn: (key) => JSON.stringify(key), maxBatchSize: MOST_KEYS })

/** The list of one parent, asked for in some way. */
export type Asked<Args> = { readonly of: string; readonly args: Args }
/** As `single`, with a call for each way of asking. */
const listed = <Args, Value>(load: (parents: readonly string[], args: Args) => Promise<readonly Value[]>) =>
  single<Asked<Args>, Value>(async (keys) => {
    const groups = new Map<string, Asked<Args>[]>()
    for (const key of keys) {
      const way = JSON.stringify(key.args)
      groups.set(way, [...(groups.get(way) ?? []), key])
    }
    const found = new Map<Asked<Args>, Value>()
    for (const group of groups.values()) {
      const parents = group.map((key) => key.of)
      const values = await load(parents, group[0]!.args)
      for (const [i, key] of group.entries()) found.set(key, values[i]!)
    }
    return keys.map((key) => found.get(key)!)
  })

type Rest<Load> = Load extends (office: never, of: never, args: infer Args) => unknown ? Args : never

/** What lists of lists ask for, gathered: so many calls of the store as a query has levels, not as it has rows. For one request. */
export function loadersOf(office: Pick<Office, 'store'>) {
  return {
    project: single((slugs: readonly string[]) => many.projectsOf(office, slugs)),
    latest: single((slugs: readonly string[]) => many.latestOf(office, slugs)),
    revision: single((keys: readonly many.RevisionKey[]) => many.revisionsOf(office, keys)),
    assessments: listed((slugs, args: Rest<typeof many.assessmentsOf>) => many.assessmentsOf(office, slugs, args)),
    assessmentCount: listed((slugs, args: Rest<typeof many.countAssessmentsOf>) =>
      many.countAssessmentsOf(office, slugs, args),
    ),
    assessmentSums: listed((slugs, args: Rest<typeof many.sumAssessmentsOf>) =>
      many.sumAssessmentsOf(office, slugs, args),
    ),
    caps: listed((records, args: Rest<typeof many.capsOf>) => many.capsOf(office, records, args)),
    capCount: listed((records, args: Rest<typeof many.countCapsOf>) => many.countCapsOf(office, records, args)),
    cap: single((keys: readonly many.MarkKey[]) => many.capsByMark(office, keys)),
    checks: single((keys: readonly many.CapKey[]) => many.checksOf(office, keys)),
    trace: single((keys: readonly many.CapKey[]) => many.tracesOf(office, keys)),
    neighbours: listed((records, args: Rest<typeof many.neighbourPagesOf>) =>
      many.neighbourPagesOf(office, records, args),
    ),
    neighbourCount: listed((records, args: Rest<typeof many.countNeighboursOf>) =>
      many.countNeighboursOf(office, records, args),
    ),
    signatures: single((records: readonly string[]) => many.signaturesOf(office, records)),
    byCheck: single((records: readonly string[]) => many.checkSumsOf(office, records)),
    byGround: single((records: readonly string[]) => many.groundSumsOf(office, records)),
    byPileType: single((records: readonly string[]) => many.pileTypeSumsOf(office, records)),
  }
}
export type Loaders = ReturnType<typeof loadersOf>
