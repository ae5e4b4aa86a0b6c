/**
 * Bytes that break the file format. It never leaves the reader: `readPdfFile` turns it into a typed error, so that
 * the recursive descent below it can stay free of plumbing.
 */
export class PdfSyntaxError extends Error {
  constructor(
    readonly offset: number,
    reason: string,
  ) {
    super(`${reason}, at byte ${offset}`)
    this.name = 'PdfSyntaxError'
  }
}
