import { sql } from 'kysely'

import type { Migration } from './migration'

/** Reports with their review and signatures, and the practice's certificates. */
export const reports: Migration = {
  name: '0006_reports',
  up: [
    sql`create table practice_authority (
      id integer primary key check (id = 1),
      certificate_pem text not null,
      fingerprint text not null,
      sealed_key text not null check (json_valid(sealed_key)),
      created_at integer not null
    ) strict`,
    sql`create table signing_certificate (
      id text primary key check (length(id) = 26),
      person_id text not null references person (id),
      certificate_pem text not null,
      fingerprint text not null unique,
      serial text not null unique,
      sealed_key text not null check (json_valid(sealed_key)),
      valid_from integer not null,
      valid_until integer not null,
      created_at integer not null,
      revoked_at integer
    ) strict`,
    sql`create table report (
      id text primary key check (length(id) = 26),
      engagement_id text not null references engagement (id),
      number text not null,
      revision integer not null check (revision > 0),
      title text not null check (length(title) between 1 and 200),
      summary_belief text not null,
      summary_certainty text not null,
      summary_next_step text not null,
      status text not null
        check (status in ('draft', 'in_review', 'returned', 'approved', 'author_signed', 'released', 'withdrawn')),
      author_id text not null references person (id),
      reviewer_id text references person (id),
      check_code text not null unique,
      document text check (document is null or json_valid(document)),
      file_id text,
      file_sha256 text,
      signature_areas text check (signature_areas is null or json_valid(signature_areas)),
      created_at integer not null,
      submitted_at integer,
      approved_at integer,
      released_at integer,
      unique (number, revision),
      check (reviewer_id is null or reviewer_id <> author_id),
      check (status in ('draft', 'returned') or document is not null),
      check (status not in ('author_signed', 'released', 'withdrawn') or file_sha256 is not null)
    ) strict`,
    sql`create index report_by_engagement on report (engagement_id)`,
    sql`create table report_finding (
      report_id text not null references report (id),
      finding_id text not null references finding (id),
      position integer not null,
      primary key (report_id, finding_id)
    ) strict`,
    sql`create table report_remark (
      id text primary key check (length(id) = 26),
      report_id text not null references report (id),
      author_id text not null references person (id),
      section text not null,
      text text not null check (length(text) > 0),
      created_at integer not null
    ) strict`,
    sql`create table report_signature (
      report_id text not null references report (id),
      role text not null check (role in ('author', 'reviewer')),
      person_id text not null references person (id),
      certificate_fingerprint text not null references signing_certificate (fingerprint),
      signed_at integer not null,
      primary key (report_id, role)
    ) strict`,
  ],
}
