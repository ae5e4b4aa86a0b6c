import { sql } from 'kysely'

import type { Migration } from './migration'

/** Mail that a transaction decided to send; a dispatcher delivers it afterwards. */
export const outbox: Migration = {
  name: '0008_outbox',
  up: [
    sql`create table outbox_message (
      id text primary key check (length(id) = 26),
      kind text not null,
      recipient text not null,
      payload text not null check (json_valid(payload)),
      dedupe_key text not null unique,
      attempts integer not null default 0,
      next_attempt_at integer not null,
      last_error text,
      sent_at integer,
      created_at integer not null
    ) strict`,
    sql`create index outbox_waiting on outbox_message (next_attempt_at) where sent_at is null`,
  ],
}
