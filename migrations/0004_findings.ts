import { sql } from 'kysely'

import type { Migration } from './migration'

/** Computations that can be repeated to the same digits, and the claims that rest on them. */
export const findings: Migration = {
  name: '0004_findings',
  up: [
    sql`create table method_run (
      id text primary key check (length(id) = 26),
      engagement_id text not null references engagement (id),
      number integer not null check (number > 0),
      method_id text not null,
      method_version integer not null check (method_version > 0),
      inputs text not null check (json_valid(inputs)),
      result text not null check (json_valid(result)),
      figures text not null check (json_valid(figures)),
      created_by text not null references person (id),
      created_at integer not null,
      unique (engagement_id, number)
    ) strict`,
    sql`create table method_run_evidence (
      run_id text not null references method_run (id),
      evidence_id text not null references evidence (id),
      sha256 text not null check (length(sha256) = 64),
      primary key (run_id, evidence_id)
    ) strict`,
    sql`create trigger method_run_is_kept before update on method_run
      begin select raise(abort, 'a run is never edited'); end`,
    sql`create trigger method_run_is_not_dropped before delete on method_run
      begin select raise(abort, 'a run is never deleted'); end`,
    sql`create trigger method_run_evidence_is_kept before update on method_run_evidence
      begin select raise(abort, 'the evidence of a run is never edited'); end`,
    sql`create trigger method_run_evidence_is_not_dropped before delete on method_run_evidence
      begin select raise(abort, 'the evidence of a run is never deleted'); end`,
    sql`create table finding (
      id text primary key check (length(id) = 26),
      engagement_id text not null references engagement (id),
      number integer not null check (number > 0),
      claim text not null check (length(claim) > 0),
      severity text not null check (severity in ('critical', 'major', 'minor', 'note')),
      confidence text not null check (confidence in ('high', 'medium', 'low')),
      reasoning text not null,
      alternative_causes text not null,
      disproving_experiment text not null,
      status text not null check (status in ('draft', 'published')),
      author_id text not null references person (id),
      created_at integer not null,
      published_at integer,
      unique (engagement_id, number),
      check ((status = 'published') = (published_at is not null))
    ) strict`,
    sql`create trigger finding_is_kept_once_published before update on finding when old.status = 'published'
      begin select raise(abort, 'a published finding is never edited'); end`,
    sql`create table finding_run (
      finding_id text not null references finding (id),
      run_id text not null references method_run (id),
      position integer not null,
      primary key (finding_id, run_id)
    ) strict`,
    sql`create trigger finding_run_is_kept_once_published before delete on finding_run
      when (select status from finding where id = old.finding_id) = 'published'
      begin select raise(abort, 'a published finding is never edited'); end`,
    sql`create table finding_action (
      id text primary key check (length(id) = 26),
      finding_id text not null references finding (id),
      position integer not null,
      instruction text not null check (length(instruction) > 0),
      part_values text not null,
      side_effects text not null
    ) strict`,
    sql`create trigger finding_action_is_kept_once_published before delete on finding_action
      when (select status from finding where id = old.finding_id) = 'published'
      begin select raise(abort, 'a published finding is never edited'); end`,
  ],
}
