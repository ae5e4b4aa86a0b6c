import { identity } from './0001_identity'
import { engagements } from './0002_engagements'
import { evidence } from './0003_evidence'
import { findings } from './0004_findings'
import { hours } from './0005_hours'
import { reports } from './0006_reports'
import { billing } from './0007_billing'
import { outbox } from './0008_outbox'
import type { Migration } from './migration'

/** Every migration in the order in which it is applied. */
export const migrations: readonly Migration[] = [
  identity,
  engagements,
  evidence,
  findings,
  hours,
  reports,
  billing,
  outbox,
]
