import { sql } from 'kysely'

import type { Migration } from './migration'

/** Files that clients and consultants send in, what was recognised in them, and the stated measurement facts. */
export const evidence: Migration = {
  name: '0003_evidence',
  up: [
    sql`create table evidence (
      id text primary key check (length(id) = 26),
      engagement_id text not null references engagement (id),
      number integer not null check (number > 0),
      name text not null check (length(name) between 1 and 255),
      kind text not null check (kind in ('capture', 'document', 'picture', 'attachment')),
      media_type text not null,
      size_bytes integer not null check (size_bytes > 0),
      sha256 text not null check (length(sha256) = 64),
      status text not null check (status in ('checking', 'ready', 'refused')),
      refusal text,
      uploaded_by text not null references person (id),
      created_at integer not null,
      unique (engagement_id, number),
      check ((status = 'refused') = (refusal is not null))
    ) strict`,
    sql`create table capture (
      evidence_id text primary key references evidence (id),
      samples integer not null check (samples > 0),
      start_seconds real not null,
      interval_seconds real not null check (interval_seconds > 0),
      interval_source text not null,
      warnings text not null
    ) strict`,
    sql`create table capture_channel (
      evidence_id text not null references capture (evidence_id),
      position integer not null check (position >= 0),
      name text not null,
      unit text not null,
      minimum real not null,
      maximum real not null,
      primary key (evidence_id, position)
    ) strict`,
    sql`create table measurement_fact (
      evidence_id text not null references evidence (id),
      key text not null,
      value text not null,
      stated_by text not null references person (id),
      stated_at integer not null,
      primary key (evidence_id, key)
    ) strict`,
  ],
}
