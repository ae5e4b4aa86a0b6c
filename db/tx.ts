import 'server-only'

import { insideTransaction, type Db, type Tx } from './client'

/** Runs `work` in one BEGIN IMMEDIATE transaction: all of it is kept, or none when it throws. */
export function withTx<T>(db: Db, work: (tx: Tx) => Promise<T>): Promise<T> {
  return db.transaction().execute((tx) => insideTransaction.run(true, () => work(tx)))
}
