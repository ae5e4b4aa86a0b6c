/** A UTC instant (milliseconds, cut to the second) in the file format's notation (ISO 32000-1, 7.9.4). */
export function formatPdfDate(instant: number): string {
  const digits = new Date(instant).toISOString().slice(0, 19).replace(/\D/g, '')
  return `D:${digits}Z`
}

/** Reads the one notation that `formatPdfDate` writes; null for anything else. */
export function parsePdfDate(text: string): number | null {
  const match = /^D:(\d{4})(\d\d)(\d\d)(\d\d)(\d\d)(\d\d)Z$/.exec(text)
  if (!match) return null
  const [, year, month, day, hour, minute, second] = match
  const instant = Date.parse(`${year}-${month}-${day}T${hour}:${minute}:${second}Z`)
  return Number.isNaN(instant) || formatPdfDate(instant) !== text ? null : instant
}
