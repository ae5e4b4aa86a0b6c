import { sql } from 'kysely'

import type { Migration } from './migration'

/** The catalogue of hour blocks, purchases, and what the payment provider told us. Money is integer cents. */
export const billing: Migration = {
  name: '0007_billing',
  up: [
    sql`create table block_offer (
      id text primary key check (length(id) = 26),
      title text not null check (length(title) between 1 and 200),
      minutes integer not null check (minutes > 0),
      net_cents integer not null check (net_cents > 0),
      currency text not null check (length(currency) = 3),
      validity_months integer not null check (validity_months between 1 and 60),
      tax_basis_points integer not null check (tax_basis_points between 0 and 10000),
      tax_label text not null,
      created_at integer not null,
      archived_at integer
    ) strict`,
    sql`create table purchase (
      id text primary key check (length(id) = 26),
      company_id text not null references company (id),
      person_id text not null references person (id),
      offer_id text not null references block_offer (id),
      title text not null,
      minutes integer not null check (minutes > 0),
      validity_months integer not null,
      net_cents integer not null check (net_cents > 0),
      tax_cents integer not null check (tax_cents >= 0),
      gross_cents integer not null,
      tax_label text not null,
      currency text not null check (length(currency) = 3),
      status text not null check (status in ('open', 'paid', 'failed', 'expired', 'refunded')),
      session_id text unique,
      receipt_number integer unique,
      created_at integer not null,
      paid_at integer,
      check (gross_cents = net_cents + tax_cents),
      check ((receipt_number is null) = (paid_at is null))
    ) strict`,
    sql`create index purchase_by_company on purchase (company_id, created_at)`,
    sql`create table payment (
      id text primary key check (length(id) = 26),
      purchase_id text not null unique references purchase (id),
      payment_intent_id text not null unique,
      gross_cents integer not null check (gross_cents > 0),
      currency text not null check (length(currency) = 3),
      balance_transaction_id text unique,
      settled_cents integer,
      settled_currency text check (length(settled_currency) = 3),
      fee_cents integer,
      net_cents integer,
      created_at integer not null,
      check ((balance_transaction_id is null) = (settled_cents is null)),
      check ((settled_cents is null) = (settled_currency is null)),
      check ((settled_cents is null) = (fee_cents is null)),
      check ((settled_cents is null) = (net_cents is null)),
      check (settled_cents is null or settled_cents = fee_cents + net_cents)
    ) strict`,
    sql`create table provider_event (
      id text primary key,
      type text not null,
      object_id text,
      created_at integer not null,
      received_at integer not null,
      outcome text not null check (outcome in ('applied', 'already_applied', 'ignored', 'refused')),
      note text not null
    ) strict`,
    sql`create table provider_effect (
      object_id text not null,
      effect text not null,
      event_id text not null references provider_event (id) deferrable initially deferred,
      primary key (object_id, effect)
    ) strict`,
  ],
}
