import { execFileSync, spawnSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

/** "ngspice-39"; undefined where it is not installed. */
export const ngspiceVersion = /ngspice-\d+/u.exec(
  spawnSync('ngspice', ['--version'], { encoding: 'utf8' }).stdout ?? '',
)?.[0]

type Transient = {
  /** The title and the elements, a line each. */
  readonly circuit: readonly string[]
  readonly reltol: string
  /** As the simulator takes it: "tran 10p 60n 0 10p". */
  readonly analysis: string
  readonly node: string
}

/** Time and voltage at one node, row by row, by a transient analysis. */
export function transientBy(wanted: Transient): readonly (readonly [number, number])[] {
  const folder = mkdtempSync(join(tmpdir(), 'ngspice-'))
  try {
    const [netlist, output] = [join(folder, 'circuit.cir'), join(folder, 'voltage.data')]
    writeFileSync(netlist, netlistOf(wanted, output))
    execFileSync('ngspice', ['-b', netlist], { stdio: 'ignore' })
    const rows = readFileSync(output, 'utf8').trim().split('\n')
    return rows.map((row) => {
      const [time = NaN, voltage = NaN] = row.trim().split(/\s+/u).map(Number)
      return [time, voltage]
    })
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}

const netlistOf = ({ circuit, reltol, analysis, node }: Transient, output: string): string =>
  [
    ...circuit,
    `.options reltol=${reltol} abstol=1e-12 vntol=1e-9`,
    '.control',
    'set wr_singlescale',
    analysis,
    `wrdata ${output} v(${node})`,
    'quit',
    '.endc',
    '.end',
  ].join('\n')
