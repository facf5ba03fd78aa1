import { joinTrace, type Trace, type TracePart } from '../engine/index.ts'
import { unpack } from './blobs.ts'
import type { RankedCap } from './cap-pages.ts'
import type { Store } from './open-store.ts'
import { headColumns, type RecordHead } from './read-records.ts'
import type { CheckRow, ProjectRow, SignatureRow } from './tables.ts'

/** Rows of many parents, each kind in one query: lists of lists do not ask once for each of their members. */

export const findProjects = ({ reader }: Store, slugs: readonly string[]): Promise<ProjectRow[]> =>
  reader.selectFrom('projects').selectAll().where('slug', 'in', slugs).execute()

/** The newest record of each project. */
export const latestRecords = ({ reader }: Store, slugs: readonly string[]): Promise<RecordHead[]> =>
  reader
    .selectFrom('projects')
    .innerJoin('records', (join) =>
      join.onRef('records.project', '=', 'projects.slug').onRef('records.revision', '=', 'projects.revision'),
    )
    .select(headColumns.map((column) => `records.${column}` as const))
    .where('projects.slug', 'in', slugs)
    .execute()

export type RevisionKey = { readonly project: string; readonly revision: number }
export const findRevisions = ({ reader }: Store, keys: readonly RevisionKey[]): Promise<RecordHead[]> =>
  reader
    .selectFrom('records')
    .select(headColumns)
    .where(({ eb, or, and }) =>
      or(keys.map(({ project, revision }) => and([eb('project', '=', project), eb('revision', '=', revision)]))),
    )
    .execute()

export type MarkKey = { readonly record: string; readonly mark: string }
export async function findCaps({ reader }: Store, keys: readonly MarkKey[]): Promise<RankedCap[]> {
  const rows = await reader
    .selectFrom('caps')
    .selectAll()
    .where(({ eb, or, and }) =>
      or(keys.map(({ record, mark }) => and([eb('record', '=', record), eb('mark', '=', mark)]))),
    )
    .execute()
  return rows.map(({ body, ...row }) => ({ ...row, rank: row.ordinal }))
}

export type CapKey = { readonly record: string; readonly cap: number }
/** The ordinals asked for, by record. */
function byRecord(keys: readonly CapKey[]): [string, number[]][] {
  const found = new Map<string, number[]>()
  for (const { record, cap } of keys) found.set(record, [...(found.get(record) ?? []), cap])
  return [...found]
}

export const checksOf = ({ reader }: Store, keys: readonly CapKey[]): Promise<CheckRow[]> =>
  reader
    .selectFrom('checks')
    .selectAll()
    .where(({ eb, or, and }) =>
      or(byRecord(keys).map(([record, caps]) => and([eb('record', '=', record), eb('cap', 'in', caps)]))),
    )
    .orderBy('utilisation', 'desc')
    .orderBy('check_kind')
    .execute()

/** Parts of traces, as they lie in the store. */
async function traceParts({ reader }: Store, keys: readonly CapKey[]) {
  const rows = await reader
    .selectFrom('traces')
    .selectAll()
    .where(({ eb, or, and }) =>
      or(byRecord(keys).map(([record, caps]) => and([eb('record', '=', record), eb('cap', 'in', caps)]))),
    )
    .execute()
  return rows.map(({ record, cap, trace }) => ({ record, cap, part: JSON.parse(unpack(trace)) as TracePart }))
}

/** The traces of caps, each put together from its own part and those that it shares with others: a call for each step of the sharing. */
export async function tracesOf(store: Store, keys: readonly CapKey[]): Promise<readonly (Trace | null)[]> {
  const place = ({ record, cap }: CapKey) => `${record}/${cap}`
  const parts = new Map<string, TracePart>()
  for (let ahead = keys; ahead.length > 0; ) {
    const found = await traceParts(store, ahead)
    for (const { part, ...key } of found) parts.set(place(key), part)
    const used = found.flatMap(({ record, part }) => part.uses.map((cap) => ({ record, cap })))
    const next = new Map(used.filter((key) => !parts.has(place(key))).map((key) => [place(key), key]))
    ahead = [...next.values()]
  }
  return keys.map((key) => {
    const own = new Map<number, TracePart>()
    const collect = (cap: number): void => {
      const part = parts.get(place({ record: key.record, cap }))
      if (!part || own.has(cap)) return
      own.set(cap, part)
      for (const other of part.uses) collect(other)
    }
    collect(key.cap)
    return own.has(key.cap) ? joinTrace([...own].sort(([a], [b]) => a - b).map(([, part]) => part)) : null
  })
}

export const signaturesOf = ({ reader }: Store, records: readonly string[]): Promise<SignatureRow[]> =>
  reader.selectFrom('signatures').selectAll().where('record', 'in', records).orderBy('ordinal').execute()
