import path from 'node:path'

import { sql } from 'kysely'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { backUpDatabase } from '@/db/backup'
import { openDatabase } from '@/db/client'
import { migrate, pendingMigrations } from '@/db/migrate'
import { withTx } from '@/db/tx'
import { migrations } from '@/migrations/migrations'

import { openTestPortal, testStart, type TestPortal } from '../support/test-portal'

let portal: TestPortal

beforeEach(async () => {
  portal = await openTestPortal()
})

afterEach(() => portal.close())

async function pragma(name: string): Promise<unknown> {
  const result = await sql.raw<Record<string, unknown>>(`pragma ${name}`).execute(portal.db)
  return Object.values(result.rows[0] ?? {})[0]
}

const company = (name: string) => ({ id: portal.deps.ids.newId(), name, created_at: testStart })

describe('the open database', () => {
  it('DB1: has write-ahead logging, full synchronisation, foreign keys and a busy timeout', async () => {
    expect(await pragma('journal_mode')).toBe('wal')
    expect(await pragma('synchronous')).toBe(2)
    expect(await pragma('foreign_keys')).toBe(1)
    expect(await pragma('busy_timeout')).toBe(5000)
  })

  it('DB2: is SQLite 3.51.3 or newer', async () => {
    const result = await sql<{ version: string }>`select sqlite_version() as version`.execute(portal.db)
    const [major = 0, minor = 0, patch = 0] = (result.rows[0]?.version ?? '').split('.').map(Number)
    expect(major * 1e6 + minor * 1e3 + patch).toBeGreaterThanOrEqual(3_051_003)
  })

  it('DB5: has only strict tables', async () => {
    const tables = await sql<{ name: string; strict: number }>`
      select name, strict from pragma_table_list where schema = 'main' and type = 'table'
      and name not like 'sqlite_%'`.execute(portal.db)
    expect(tables.rows.length).toBeGreaterThan(30)
    expect(tables.rows.filter((table) => table.strict !== 1)).toEqual([])
  })

  it('DB5: refuses a fraction of a minute and an unknown state', async () => {
    const block = sql`insert into block_offer values
      (${portal.deps.ids.newId()}, 'Ten hours', 1.5, 100, 'EUR', 12, 0, '', 0, null)`
    await expect(block.execute(portal.db)).rejects.toThrow(/cannot store REAL value in INTEGER/)
    const role = portal.db
      .insertInto('membership')
      .values({ company_id: 'x', person_id: 'y', role: 'owner' as never, created_at: 0, removed_at: null })
    await expect(role.execute()).rejects.toThrow(/CHECK constraint failed/)
  })
})

describe('transactions', () => {
  it('DB3: take the write lock before they read, so that two read-then-write ones queue', async () => {
    const other = openDatabase(path.join(portal.folder, 'portal.sqlite'))
    const addAfterCounting = async (db: typeof portal.db, name: string) =>
      withTx(db, async (tx) => {
        const before = await tx.selectFrom('company').select('id').execute()
        await tx.insertInto('company').values(company(name)).execute()
        return before.length
      })
    const first = await addAfterCounting(portal.db, 'First')
    const second = await addAfterCounting(other, 'Second')
    expect([first, second]).toEqual([0, 1])
    await other.destroy()
  })

  it('DB4: refuse the root handle at once instead of waiting for themselves', async () => {
    const misuse = withTx(portal.db, () => portal.db.selectFrom('company').selectAll().execute())
    await expect(misuse).rejects.toThrow('use the transaction handle instead')
    await portal.db.insertInto('company').values(company('Afterwards')).execute()
  })

  it('keep nothing when they fail', async () => {
    const failing = withTx(portal.db, async (tx) => {
      await tx.insertInto('company').values(company('Half')).execute()
      throw new Error('stopped')
    })
    await expect(failing).rejects.toThrow('stopped')
    expect(await portal.db.selectFrom('company').selectAll().execute()).toEqual([])
  })
})

describe('migrations', () => {
  it('DB13: leave the schema of before when the last statement of one fails', async () => {
    const broken = {
      name: '9999_broken',
      up: [sql`create table half_done (id text) strict`, sql`create table half_done (id text) strict`],
    }
    await expect(migrate(portal.db, testStart, [...migrations, broken])).rejects.toThrow(/already exists/)
    const tables = await sql`select name from sqlite_master where name = 'half_done'`.execute(portal.db)
    expect(tables.rows).toEqual([])
    expect(await pendingMigrations(portal.db, [...migrations, broken])).toEqual([broken])
  })

  it('are applied once', async () => {
    expect(await migrate(portal.db, testStart)).toEqual([])
  })
})

describe('backup', () => {
  it('DB8: of a database in use holds everything that was committed and passes its integrity check', async () => {
    await portal.db.insertInto('company').values(company('Osterby Pump Controls')).execute()
    const target = path.join(portal.folder, 'backup.sqlite')
    await backUpDatabase(path.join(portal.folder, 'portal.sqlite'), target)
    const copy = openDatabase(target)
    expect(await copy.selectFrom('company').select('name').execute()).toEqual([
      { name: 'Osterby Pump Controls' },
    ])
    const check = await sql<{ integrity_check: string }>`pragma integrity_check`.execute(copy)
    expect(check.rows).toEqual([{ integrity_check: 'ok' }])
    await copy.destroy()
  })
})
