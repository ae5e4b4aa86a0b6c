import { isMet, ratioOf, type BenchLine } from './benches/bench-line'
import { captureBench } from './benches/capture.bench'
import { fourierBench } from './benches/fourier.bench'
import { polygonLoopBench } from './benches/polygon-loop.bench'
import { snubberBench } from './benches/snubber.bench'

/** Every benchmark by its name. */
const benches: Readonly<Record<string, () => Promise<readonly BenchLine[]>>> = {
  fourier: fourierBench,
  'polygon-loop': polygonLoopBench,
  snubber: snubberBench,
  capture: captureBench,
}

/**
 * Measures and prints a line a figure: name, value, unit, reference measured in the same run, ratio, goal, verdict.
 * Without names every benchmark runs. Ends with 1 where a goal is missed.
 */
async function main(names: readonly string[]): Promise<void> {
  const unknown = names.find((name) => !Object.hasOwn(benches, name))
  if (unknown !== undefined) {
    process.stderr.write(
      `There is no benchmark “${unknown}”; there are: ${Object.keys(benches).join(', ')}.\n`,
    )
    process.exit(2)
  }
  const wanted = names.length === 0 ? Object.keys(benches) : names
  process.stdout.write(`${row(['name', 'value', 'unit', 'reference', 'ratio', 'goal', ''])}\n`)
  for (const name of wanted) {
    for (const line of (await benches[name]?.()) ?? []) {
      process.stdout.write(`${row(cellsOf(line))}\n`)
      if (!isMet(line)) process.exitCode = 1
    }
  }
}

function cellsOf(line: BenchLine): readonly string[] {
  const { name, value, unit, reference, goalText } = line
  return [
    name,
    short(value),
    unit,
    shortOrNone(reference),
    shortOrNone(ratioOf(line)),
    goalText,
    isMet(line) ? 'ok' : 'MISS',
  ]
}

const widths = [44, 10, 8, 10, 8, 18, 4]

const row = (cells: readonly string[]): string =>
  cells.map((cell, index) => cell.padEnd(widths[index] ?? 0)).join(' ')

const short = (value: number): string => Number(value.toPrecision(4)).toString()

const shortOrNone = (value: number | null): string => (value === null ? '–' : short(value))

await main(process.argv.slice(2))
