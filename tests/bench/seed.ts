import { sql } from 'kysely'
import { draftRecord } from '../../src/operations/draft-record.ts'
import { anonymous } from '../../src/store/actor.ts'
import { appendRecord } from '../../src/store/append-record.ts'
import type { Draft } from '../../src/store/draft.ts'
import { openStore, type Store } from '../../src/store/open-store.ts'
import { putProject } from '../../src/store/projects.ts'
import { scheduleBody } from './bodies.ts'

/** A store that grew over years: records of a few computed drafts, since what is asked of it does not depend on their numbers. */

const CAPS = 50
const COMBINATIONS = 12
/** Revisions of a project. */
const REVISIONS = 50

/** Schedules that differ in their loads, so that more or fewer caps are exceeded. */
export function drafts(): Draft[] {
  return [0.4, 0.7, 0.85, 1].map((factor) => {
    const body = scheduleBody(CAPS, COMBINATIONS)
    for (const row of body.loads.rows) {
      row.Fz *= factor
      row.Mx *= factor
      row.My *= factor
    }
    return draftRecord({ ...body, title: `Loads times ${factor}` })
  })
}

/** Opens a store in a folder and fills it with so many records, a minute apart. `traces` false leaves the traces out. */
export async function seed(folder: string, records: number, made: readonly Draft[], traces = true): Promise<Store> {
  let minute = Date.UTC(2020, 0, 1)
  const store = await openStore({ folder, clock: () => new Date(minute) })
  // Nobody relies on this store: the disk need not be waited for.
  await sql`pragma synchronous = off`.execute(store.db)
  for (let i = 0; i < records; i++) {
    const slug = `project-${Math.floor(i / REVISIONS)}`
    if (i % REVISIONS === 0) await putProject(store, slug, `Project ${i / REVISIONS}`)
    const draft = made[(i * 7) % made.length]!
    await appendRecord(store, slug, anonymous, traces ? draft : { ...draft, traces: [] })
    minute += 60_000
  }
  return store
}
