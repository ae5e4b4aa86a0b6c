import { sql } from 'kysely'

import type { Migration } from './migration'

/** Companies, people, what they may do, and how they prove who they are. */
export const identity: Migration = {
  name: '0001_identity',
  up: [
    sql`create table company (
      id text primary key check (length(id) = 26),
      name text not null unique check (length(name) between 1 and 200),
      created_at integer not null
    ) strict`,
    sql`create table person (
      id text primary key check (length(id) = 26),
      email text not null unique check (length(email) between 3 and 254),
      name text not null check (length(name) between 1 and 200),
      password_hash text,
      is_consultant integer not null default 0 check (is_consultant in (0, 1)),
      is_administrator integer not null default 0 check (is_administrator in (0, 1)),
      created_at integer not null,
      disabled_at integer
    ) strict`,
    sql`create table membership (
      company_id text not null references company (id),
      person_id text not null references person (id),
      role text not null check (role in ('purchaser', 'engineer')),
      created_at integer not null,
      removed_at integer,
      primary key (company_id, person_id)
    ) strict`,
    sql`create index membership_by_person on membership (person_id)`,
    sql`create table invitation (
      id text primary key check (length(id) = 26),
      token_hash text not null unique,
      email text not null,
      company_id text references company (id),
      role text not null check (role in ('purchaser', 'engineer', 'consultant', 'administrator')),
      invited_by text not null references person (id),
      created_at integer not null,
      expires_at integer not null,
      accepted_at integer,
      check ((role in ('purchaser', 'engineer')) = (company_id is not null))
    ) strict`,
    sql`create table one_time_link (
      id text primary key check (length(id) = 26),
      token_hash text not null unique,
      purpose text not null check (purpose in ('invitation', 'password_reset')),
      person_id text references person (id),
      invitation_id text references invitation (id),
      browser_hash text not null,
      created_at integer not null,
      expires_at integer not null,
      used_at integer,
      check ((purpose = 'invitation') = (invitation_id is not null)),
      check ((purpose = 'password_reset') = (person_id is not null))
    ) strict`,
    sql`create table session (
      id_hash text primary key,
      person_id text not null references person (id),
      created_at integer not null,
      last_seen_at integer not null,
      ended_at integer
    ) strict`,
    sql`create index session_by_person on session (person_id)`,
    sql`create table throttle_event (
      id integer primary key,
      bucket text not null,
      at integer not null
    ) strict`,
    sql`create index throttle_event_by_bucket on throttle_event (bucket, at)`,
    sql`create table confidentiality_terms (
      version integer primary key check (version > 0),
      title text not null,
      body text not null,
      published_at integer not null
    ) strict`,
    sql`create table confidentiality_acceptance (
      person_id text not null references person (id),
      company_id text not null references company (id),
      version integer not null references confidentiality_terms (version),
      typed_name text not null check (length(typed_name) between 1 and 200),
      network_address text not null,
      accepted_at integer not null,
      primary key (person_id, company_id, version)
    ) strict`,
  ],
}
