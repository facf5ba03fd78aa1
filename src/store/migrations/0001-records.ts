import { sql } from 'kysely'
import type { Migration } from './migration.ts'

const immutable = ['records', 'caps', 'checks', 'neighbours', 'traces', 'signatures']

/** Projects, records with their rows, signatures, keys, replies of repeated requests. What each column holds: `tables.ts`. */
export const records: Migration = {
  name: 'records',
  async up(db, { blob, text, immutable: refusals }) {
    const real = sql`double precision`
    const tables = [
      sql`create table projects (
        slug ${text} not null primary key, title ${text} not null, created_at ${text} not null, updated_at ${text} not null,
        revision integer not null, head ${text} not null)`,
      sql`create table records (
        id ${text} not null primary key, project ${text} not null references projects, revision integer not null,
        title ${text} not null, created_at ${text} not null, actor ${text} not null, actor_key ${text}, engine ${text} not null,
        request_hash ${text} not null, content_hash ${text} not null, trace_hash ${text} not null,
        previous_hash ${text} not null, record_hash ${text} not null,
        caps integer not null, satisfied integer not null, exceeded integer not null,
        worst_cap ${text}, worst_check ${text}, worst_combination ${text}, worst_utilisation ${real},
        summary ${text} not null, notices ${text} not null, outcome ${blob} not null, request ${blob} not null,
        unique (project, revision))`,
      sql`create table caps (
        record ${text} not null references records, mark ${text} not null, ordinal integer not null,
        ground ${text} not null, pile_type ${text} not null, pile_count integer not null, x ${real} not null, y ${real} not null,
        governing_check ${text}, governing_combination ${text}, utilisation ${real}, exceeded integer not null,
        settlement ${real}, tilt ${real},
        stiffness_vertical ${real} not null, stiffness_rocking_x ${real} not null, stiffness_rocking_y ${real} not null,
        body ${blob} not null,
        primary key (record, ordinal), unique (record, mark))`,
      sql`create table checks (
        record ${text} not null references records, cap integer not null, mark ${text} not null, check_kind ${text} not null,
        limit_state ${text} not null, combination ${text} not null, demand ${real} not null, resistance ${real} not null,
        utilisation ${real} not null, exceeded integer not null, pile integer,
        primary key (record, cap, check_kind))`,
      sql`create table neighbours (
        record ${text} not null references records, ordinal integer not null, a ${text} not null, b ${text} not null,
        distance ${real} not null, combination ${text} not null, differential_settlement ${real} not null,
        angular_distortion ${real} not null, utilisation ${real}, exceeded integer,
        primary key (record, ordinal))`,
      sql`create table traces (
        record ${text} not null references records, cap integer not null, trace ${blob} not null,
        primary key (record, cap))`,
      sql`create table signatures (
        id ${text} not null primary key, record ${text} not null references records, ordinal integer not null,
        role ${text} not null, meaning ${text} not null, actor ${text} not null, actor_key ${text}, signed_at ${text} not null,
        signed_hash ${text} not null, previous_hash ${text} not null, signature_hash ${text} not null,
        unique (record, ordinal), unique (record, role))`,
      sql`create table keys (
        id ${text} not null primary key, hash ${text} not null unique, name ${text} not null, scopes ${text} not null,
        projects ${text} not null, created_at ${text} not null, expires_at ${text}, revoked_at ${text}, replaces ${text})`,
      sql`create table idempotency (
        owner ${text} not null, key ${text} not null, fingerprint ${text} not null, state ${text} not null,
        runner ${text} not null, lease_until ${text} not null, expires_at ${text} not null,
        status integer, headers ${text}, body ${blob},
        primary key (owner, key))`,
      sql`create table probe (id integer not null primary key, written_at ${text} not null)`,
      sql`create index records_by_time on records (created_at, id)`,
      sql`create index caps_by_utilisation on caps (record, utilisation)`,
      sql`create index checks_by_utilisation on checks (record, check_kind, utilisation)`,
      sql`create index idempotency_by_expiry on idempotency (expires_at)`,
    ]
    for (const statement of [...tables, ...immutable.flatMap(refusals)]) await statement.execute(db)
  },
}
