import type { Db } from '@/db/client'
import type { CaptureAnalyser } from '@/lib/ports/capture-analyser'
import type { Clock } from '@/lib/ports/clock'
import type { FileStore } from '@/lib/ports/file-store'
import type { Ids } from '@/lib/ports/ids'
import type { PasswordHasher } from '@/lib/ports/password-hasher'
import type { Payments } from '@/lib/ports/payments'
import type { PdfRenderer } from '@/lib/ports/pdf-renderer'
import type { SpectrumComputer } from '@/lib/ports/spectrum-computer'

/** Where a request came from, as far as it is known. */
export type RequestInfo = {
  readonly id: string
  readonly address: string
  /** A random value kept in the browser's cookie; ties a mailed link to the browser that asked for it. */
  readonly browserSecret: string
}

export type PracticeSettings = {
  readonly practiceName: string
  readonly practiceAddress: string
  readonly publicUrl: string
  readonly uploadLimitBytes: number
  /** Opens the practice's certificate authority. */
  readonly authorityPassphrase: string
}

/** Everything a service needs from outside, handed in so that tests can hand in other pieces. */
export type Deps = {
  readonly db: Db
  readonly clock: Clock
  readonly ids: Ids
  readonly files: FileStore
  readonly captures: CaptureAnalyser
  readonly spectra: SpectrumComputer
  readonly passwords: PasswordHasher
  readonly payments: Payments
  readonly pdf: PdfRenderer
  readonly settings: PracticeSettings
  readonly request: RequestInfo
}
