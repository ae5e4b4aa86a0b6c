import { sql } from 'kysely'

import type { Migration } from './migration'

/** What a client asks for, who works on it, and the agreed scope. Electrical values are SI. */
export const engagements: Migration = {
  name: '0002_engagements',
  up: [
    sql`create table engagement (
      id text primary key check (length(id) = 26),
      company_id text not null references company (id),
      number integer not null unique check (number > 0),
      title text not null check (length(title) between 1 and 200),
      status text not null check (status in ('briefed', 'scoped', 'active', 'closed')),
      opened_by text not null references person (id),
      created_at integer not null
    ) strict`,
    sql`create index engagement_by_company on engagement (company_id)`,
    sql`create table brief (
      engagement_id text primary key references engagement (id),
      product text not null,
      goal_standard text not null,
      goal_class text not null,
      goal_test_date text,
      symptom text not null,
      vin_volts real,
      vout_volts real,
      iout_amperes real,
      switching_hertz real check (switching_hertz is null or switching_hertz > 0),
      spread_spectrum text not null,
      already_tried text not null
    ) strict`,
    sql`create table known_oscillator (
      engagement_id text not null references engagement (id),
      position integer not null check (position >= 0),
      name text not null,
      hertz real not null check (hertz > 0),
      tolerance_ppm real not null check (tolerance_ppm >= 0),
      primary key (engagement_id, position)
    ) strict`,
    sql`create table engagement_client (
      engagement_id text not null references engagement (id),
      person_id text not null references person (id),
      added_at integer not null,
      removed_at integer,
      primary key (engagement_id, person_id)
    ) strict`,
    sql`create table engagement_consultant (
      engagement_id text not null references engagement (id),
      person_id text not null references person (id),
      assigned_at integer not null,
      removed_at integer,
      primary key (engagement_id, person_id)
    ) strict`,
    sql`create table scope (
      id text primary key check (length(id) = 26),
      engagement_id text not null references engagement (id),
      version integer not null check (version > 0),
      body text not null check (length(body) > 0),
      cap_minutes integer not null check (cap_minutes > 0),
      status text not null check (status in ('draft', 'proposed', 'approved', 'declined', 'superseded')),
      author_id text not null references person (id),
      created_at integer not null,
      proposed_at integer,
      decided_by text references person (id),
      decided_at integer,
      decision_note text,
      unique (engagement_id, version)
    ) strict`,
    sql`create unique index scope_one_approved on scope (engagement_id) where status = 'approved'`,
  ],
}
