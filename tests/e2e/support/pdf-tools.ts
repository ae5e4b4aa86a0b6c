import { execFileSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'

/** What poppler and qpdf, which know nothing of us, say of a signed file. */
export function askPdfTools(bytes: Buffer): {
  readonly pdfsig: string
  readonly qpdf: string
  readonly text: string
} {
  const folder = mkdtempSync(path.join(tmpdir(), 'quellbench-pdf-'))
  const file = path.join(folder, 'report.pdf')
  writeFileSync(file, bytes)
  const run = (program: string, ...args: string[]) =>
    execFileSync(program, args, { encoding: 'utf8', stdio: ['ignore', 'pipe', 'pipe'] })
  try {
    return {
      pdfsig: run('pdfsig', '-nocert', file),
      qpdf: run('qpdf', '--check', file),
      text: run('pdftotext', '-layout', file, '-'),
    }
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}
