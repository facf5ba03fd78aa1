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

/** Traces as JSON. */
export async function tracesOf({ reader }: Store, keys: readonly CapKey[]) {
  const rows = await reader
    .selectFrom('traces')
    .selectAll()
    .where(({ eb, or, and }) =>
      or(byRecord(keys).map(([record, caps]) => and([eb('record', '=', record), eb('cap', 'in', caps)]))),
    )
    .execute()
  return rows.map(({ record, cap, trace }) => ({ record, cap, text: unpack(trace) }))
}

export const signaturesOf = ({ reader }: Store, records: readonly string[]): Promise<SignatureRow[]> =>
  reader.selectFrom('signatures').selectAll().where('record', 'in', records).orderBy('ordinal').execute()
