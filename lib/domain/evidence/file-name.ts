import { err, ok, type Result } from '@/lib/core/result'

import { nameNotUsable, type EvidenceError } from './evidence.errors'
import { evidenceLimits } from './limits'

// Marks that turn the reading direction or show nothing: they can make "…gpj.exe" read as "…exe.jpg".
const invisible = /[\u200B-\u200F\u202A-\u202E\u2060-\u2064\u2066-\u2069\uFEFF]/g
const control = /[\u0000-\u001F\u007F-\u009F]/

/**
 * The name under which a file is shown and downloaded: its last path segment without invisible marks. It is never part
 * of a path of ours. Control characters, an empty name and more than 255 characters are refused.
 */
export function cleanFileName(sent: string): Result<string, EvidenceError> {
  if (control.test(sent)) {
    return err(nameNotUsable('The file name holds control characters. Rename the file, then send it again.'))
  }
  const lastSegment = sent.normalize('NFC').split(/[/\\]/).at(-1) ?? ''
  const name = lastSegment.replace(invisible, '').trim()
  if (name === '' || /^\.+$/.test(name)) {
    return err(nameNotUsable('The file has no name. Give it one with an ending such as .csv or .pdf.'))
  }
  if (name.length > evidenceLimits.nameLength) {
    return err(
      nameNotUsable(
        `The file name has ${name.length} characters; at most ${evidenceLimits.nameLength} are kept. Shorten it, then send the file again.`,
      ),
    )
  }
  return ok(name)
}

/** The ending after the last point in lower case, or nothing. */
export function extensionOf(name: string): string {
  return /[^.]\.([A-Za-z0-9]{1,10})$/.exec(name)?.[1]?.toLowerCase() ?? ''
}
