import { execFileSync, spawnSync } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'

import { afterAll, describe, expect, it } from 'vitest'

import type { SwitchNode } from '@/lib/core/snubber/network'
import { nodeVoltageAt, type Edge } from '@/lib/core/snubber/switched-edge'

const version = /ngspice-\d+/u.exec(
  spawnSync('ngspice', ['--version'], { encoding: 'utf8' }).stdout ?? '',
)?.[0]
const folder = mkdtempSync(join(tmpdir(), 'snubber-'))

afterAll(() => rmSync(folder, { recursive: true, force: true }))

const bare = { inductance: 8e-9, capacitance: 300e-12, seriesResistance: 0.15 }
const edge: Edge = { from: 0, step: 12, duration: 1.5e-9 }
const networks = [
  { name: 'bare', node: bare },
  { name: 'snubbed', node: { ...bare, snubber: { resistance: 5.1, capacitance: 820e-12 } } },
] satisfies readonly { name: string; node: SwitchNode }[]

function netlistOf(node: SwitchNode, output: string): string {
  const { inductance, capacitance, seriesResistance, snubber } = node
  return [
    'Switch node behind a straight edge',
    `V1 source 0 PWL(0 ${edge.from} ${edge.duration} ${edge.from + edge.step})`,
    `R1 source a ${seriesResistance}`,
    `L1 a node ${inductance}`,
    `C1 node 0 ${capacitance}`,
    ...(snubber ? [`R2 node b ${snubber.resistance}`, `C2 b 0 ${snubber.capacitance}`] : []),
    '.options reltol=1e-6 abstol=1e-12 vntol=1e-9',
    '.control',
    'set wr_singlescale',
    'tran 10p 60n 0 10p',
    `wrdata ${output} v(node)`,
    'quit',
    '.endc',
    '.end',
  ].join('\n')
}

function transientOf(name: string, node: SwitchNode): readonly (readonly [number, number])[] {
  const netlist = join(folder, `${name}.cir`)
  const output = join(folder, `${name}.data`)
  writeFileSync(netlist, netlistOf(node, output))
  execFileSync('ngspice', ['-b', netlist], { stdio: 'ignore' })
  const rows = readFileSync(output, 'utf8').trim().split('\n')
  return rows.map((row) => {
    const [time = NaN, voltage = NaN] = row.trim().split(/\s+/u).map(Number)
    return [time, voltage]
  })
}

// Source: a transient analysis by ngspice, a circuit simulator of its own.
describe.skipIf(version === undefined)(
  version === undefined
    ? 'exact edge response against ngspice (skipped: ngspice is not installed)'
    : `exact edge response against ${version}`,
  () => {
    it.each(networks)('agrees within 0.1 % of the step at every instant: $name', ({ name, node }) => {
      const transient = transientOf(name, node)
      const exact = nodeVoltageAt(
        node,
        edge,
        transient.map(([time]) => time),
      )
      expect(transient.length).toBeGreaterThan(5000)
      const differences = transient.map(([, voltage], index) => Math.abs(voltage - (exact[index] ?? NaN)))
      expect(Math.max(...differences)).toBeLessThan(0.001 * edge.step)
    })
  },
)
