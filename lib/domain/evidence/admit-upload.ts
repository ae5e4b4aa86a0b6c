import 'server-only'

import type { Db, Tx } from '@/db/client'
import { evidenceUsage } from '@/db/repositories/evidence.repo'
import { byteSizeInWords } from '@/lib/core/byte-size'
import { err, ok, type Result } from '@/lib/core/result'

import {
  emptyFile,
  engagementFull,
  kindNotAccepted,
  lengthNeeded,
  tooLarge,
  type EvidenceError,
} from './evidence.errors'
import { acceptedKindsInWords, fileKinds, type FileKind } from './file-kinds'
import { cleanFileName, extensionOf } from './file-name'
import { evidenceLimits } from './limits'

export type AdmittedUpload = {
  readonly name: string
  readonly extension: string
  readonly kind: FileKind
  readonly sizeBytes: number
}

/** Judges an upload by its announced name and length alone, before any byte of it is stored. */
export function admitUpload(
  sentName: string,
  announcedBytes: number | null,
  limitBytes: number,
): Result<AdmittedUpload, EvidenceError> {
  const name = cleanFileName(sentName)
  if (!name.ok) return name
  const extension = extensionOf(name.value)
  const kind = fileKinds.get(extension)
  if (!kind) return err(kindNotAccepted(name.value, acceptedKindsInWords))
  if (announcedBytes === null) return err(lengthNeeded)
  if (announcedBytes === 0) return err(emptyFile)
  if (announcedBytes > limitBytes) return err(tooLarge(announcedBytes, limitBytes, 'an upload'))
  if (kind.kind === 'capture' && announcedBytes > evidenceLimits.captureTextBytes) {
    return err(tooLarge(announcedBytes, evidenceLimits.captureTextBytes, 'a capture as text'))
  }
  return ok({ name: name.value, extension, kind, sizeBytes: announcedBytes })
}

/** Whether the engagement has room for one more file; with it the number that the file would get. */
export async function roomFor(
  db: Db | Tx,
  engagementId: string,
  sizeBytes: number,
): Promise<Result<{ readonly number: number }, EvidenceError>> {
  const usage = await evidenceUsage(db, engagementId)
  if (usage.files >= evidenceLimits.filesPerEngagement) {
    return err(
      engagementFull(
        `The engagement holds ${usage.files} files, which is as many as it can. Ask the practice to open another.`,
      ),
    )
  }
  if (usage.bytes + sizeBytes > evidenceLimits.bytesPerEngagement) {
    const limit = byteSizeInWords(evidenceLimits.bytesPerEngagement)
    return err(
      engagementFull(`The engagement would hold more than ${limit}. Ask the practice to open another.`),
    )
  }
  return ok({ number: usage.lastNumber + 1 })
}
