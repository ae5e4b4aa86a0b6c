import { existsSync, readFileSync, readdirSync } from 'node:fs'
import path from 'node:path'
import { parseArgs } from 'node:util'

import { caseOfDescription, parseCaseFile, type ReferenceCase } from '@/lib/reference/case-file'
import { CaptureAbsent, runCase, type CaseReport } from '@/lib/reference/run-case'
import type { Verdict } from '@/lib/reference/verdict'

/**
 * Runs a file of reference cases, and a folder of captures with their truths, against the core:
 *
 *     npm run reference -- <cases.json> [--captures <folder>]
 */
function main(): void {
  const { values, positionals } = parseArgs({
    allowPositionals: true,
    options: { captures: { type: 'string' } },
  })
  const [file] = positionals
  const folder = values.captures
  if (file === undefined && folder === undefined) {
    stop('Name a file of cases: npm run reference -- <cases.json> [--captures <folder>]')
  }
  const cases = file === undefined ? [] : read(file, parseCaseFile)
  const reports = [...cases, ...describedIn(folder, cases)].map((item) => runCase(item, readerOf(folder)))
  reports.forEach(printReport)
  printTotals(reports)
  process.exitCode = reports.some(({ outcome }) => outcome === 'miss') ? 1 : 0
}

/** The captures of a folder that have a truth beside them and are in no case yet. */
function describedIn(folder: string | undefined, cases: readonly ReferenceCase[]): readonly ReferenceCase[] {
  if (folder === undefined) return []
  const named = new Set(cases.map(({ inputs }) => path.basename(fileOf(inputs))))
  return readdirSync(folder)
    .filter((name) => name.endsWith('.json') && name !== 'index.json')
    .map((name) => read(path.join(folder, name), caseOfDescription))
    .filter(({ id }) => !named.has(id))
}

const fileOf = (inputs: unknown): string =>
  typeof inputs === 'object' && inputs !== null && 'file' in inputs ? String(inputs.file) : ''

const readerOf = (folder: string | undefined) => (name: string) => {
  const file = path.join(folder ?? '.', path.basename(name))
  if (folder === undefined) throw new CaptureAbsent('name the folder of the captures with --captures')
  if (!existsSync(file)) throw new CaptureAbsent(`${path.basename(name)} is not in the folder`)
  return new Uint8Array(readFileSync(file))
}

function read<T>(file: string, parse: (text: string) => T): T {
  try {
    return parse(readFileSync(file, 'utf8'))
  } catch (error) {
    return stop(
      `${file} cannot be read as reference cases: ${error instanceof Error ? error.message : error}`,
    )
  }
}

function printReport({ id, topic, outcome, verdicts, remark }: CaseReport): void {
  print(`${outcome.toUpperCase().padEnd(7)} ${id}  ${topic}${remark === null ? '' : `  (${remark})`}`)
  for (const verdict of verdicts) print(`        ${lineOf(verdict)}`)
}

function lineOf({ output, expected, got, difference, outcome }: Verdict): string {
  const off = difference === null ? '' : `  rel ${difference.toExponential(1)}`
  return `${output}: expected ${brief(expected)}, got ${brief(got)}${off}  ${outcome}`
}

function brief(value: unknown): string {
  const text = JSON.stringify(value) ?? 'nothing'
  return text.length > 90 ? `${text.slice(0, 87)}…` : text
}

function printTotals(reports: readonly CaseReport[]): void {
  print('')
  for (const topic of [...new Set(reports.map((report) => report.topic))].sort()) {
    print(`${topic.padEnd(38)} ${countsOf(reports.filter((report) => report.topic === topic))}`)
  }
  print(`${'all'.padEnd(38)} ${countsOf(reports)}`)
}

function countsOf(reports: readonly CaseReport[]): string {
  const count = (wanted: CaseReport['outcome']) => reports.filter(({ outcome }) => outcome === wanted).length
  const notRun = count('not run')
  return `${count('pass')} pass, ${count('miss')} miss${notRun === 0 ? '' : `, ${notRun} not run`}`
}

const print = (line: string): void => void process.stdout.write(`${line}\n`)

function stop(sentence: string): never {
  process.stderr.write(`${sentence}\n`)
  process.exit(2)
}

main()
