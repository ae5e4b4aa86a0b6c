import { sql } from 'kysely'

import type { Migration } from './migration'

/** Hour blocks, the append-only ledger of minutes, and consultants' time. */
export const hours: Migration = {
  name: '0005_hours',
  up: [
    sql`create table hour_block (
      id text primary key check (length(id) = 26),
      company_id text not null references company (id),
      title text not null,
      minutes integer not null check (minutes > 0),
      valid_from integer not null,
      valid_until integer not null check (valid_until > valid_from),
      source_kind text not null,
      source_id text not null,
      created_at integer not null,
      unique (source_kind, source_id)
    ) strict`,
    sql`create index hour_block_by_company on hour_block (company_id, valid_from)`,
    sql`create table hour_ledger_entry (
      id text primary key check (length(id) = 26),
      company_id text not null references company (id),
      block_id text not null references hour_block (id),
      kind text not null check (kind in ('credit', 'debit', 'reversal', 'expiry', 'adjustment')),
      minutes integer not null check (minutes <> 0),
      source_kind text not null,
      source_id text not null,
      engagement_id text references engagement (id),
      text text not null,
      created_by text references person (id),
      created_at integer not null,
      unique (source_kind, source_id, block_id),
      check ((kind = 'credit' and minutes > 0) or (kind in ('debit', 'expiry') and minutes < 0)
        or kind in ('reversal', 'adjustment'))
    ) strict`,
    sql`create index hour_ledger_by_company on hour_ledger_entry (company_id, created_at)`,
    sql`create index hour_ledger_by_block on hour_ledger_entry (block_id)`,
    sql`create trigger hour_ledger_is_append_only_update before update on hour_ledger_entry
      begin select raise(abort, 'ledger entries are never edited'); end`,
    sql`create trigger hour_ledger_is_append_only_delete before delete on hour_ledger_entry
      begin select raise(abort, 'ledger entries are never deleted'); end`,
    sql`create trigger hour_ledger_never_overdraws after insert on hour_ledger_entry
      when (select sum(minutes) from hour_ledger_entry where block_id = new.block_id) < 0
      begin select raise(abort, 'a block is never overdrawn'); end`,
    sql`create table running_timer (
      person_id text primary key references person (id),
      engagement_id text not null references engagement (id),
      work_kind text not null,
      text text not null,
      started_at integer not null
    ) strict`,
    sql`create table time_entry (
      id text primary key check (length(id) = 26),
      engagement_id text not null references engagement (id),
      person_id text not null references person (id),
      work_kind text not null
        check (work_kind in ('measurement', 'analysis', 'layout_review', 'reporting', 'review', 'meeting')),
      text text not null check (length(text) > 0),
      started_at integer not null,
      worked_seconds integer not null check (worked_seconds between 1 and 86400),
      posted_minutes integer check (posted_minutes is null or posted_minutes > 0),
      posted_at integer,
      created_at integer not null,
      check ((posted_minutes is null) = (posted_at is null))
    ) strict`,
    sql`create index time_entry_by_engagement on time_entry (engagement_id)`,
    sql`create trigger time_entry_posted_is_kept before update on time_entry when old.posted_at is not null
      begin select raise(abort, 'posted time is never edited'); end`,
    sql`create trigger time_entry_posted_is_not_dropped before delete on time_entry when old.posted_at is not null
      begin select raise(abort, 'posted time is never deleted'); end`,
  ],
}
