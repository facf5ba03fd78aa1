import { records } from './0001-records.ts'
import { jobs } from './0002-jobs.ts'
import { dashboards } from './0003-dashboards.ts'
import type { Migration } from './migration.ts'

/** In order: the first brings the database to version 1. */
export const migrations: readonly Migration[] = [records, jobs, dashboards]
