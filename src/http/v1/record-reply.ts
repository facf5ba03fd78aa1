import type { Reply } from '../../operations/answer-once.ts'
import type { ShownRecord } from '../../operations/show-record.ts'
import { recordLinks } from './record-links.ts'

/** 201 for a record that has just been made. */
export const recordReply = (record: ShownRecord, more: Readonly<Record<string, string>> = {}): Reply => ({
  status: 201,
  headers: {
    location: `/v1/assessments/${record.id}`,
    etag: `"${record.contentHash}"`,
    link: recordLinks(record.project, undefined, undefined),
    'content-type': 'application/json; charset=utf-8',
    ...more,
  },
  body: Buffer.from(JSON.stringify(record)),
})
