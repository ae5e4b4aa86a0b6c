import { findMethod } from '@/lib/core/method/registry'

import type { BenchLine } from './bench-line'

const goalSeconds = 1
const repeats = 5

const inputs = {
  lPar: '8 nH',
  cPar: '300 pF',
  rSeries: '0.15 Ω',
  vStep: '12 V',
  edge: '1.5 ns',
  fSw: '500 kHz',
  cSnub: '1 nF',
  rSnub: '5.1 Ω',
}

const tolerances = {
  lPar: '10 %',
  cPar: '10 %',
  rSeries: '20 %',
  edge: '10 %',
  cSnub: '10 %',
  rSnub: '5 %',
}

/** 10,000 draws of the exact snubber network with six tolerances: a whole run, from text to intervals. */
export const snubberBench = async (): Promise<readonly BenchLine[]> => {
  const times = Array.from({ length: repeats }, timeOfRun).sort((one, other) => one - other)
  const median = times[Math.floor(repeats / 2)] ?? Number.NaN
  return [
    {
      name: 'Exact snubber network, 10,000 draws',
      value: median,
      unit: 's',
      reference: null,
      goal: goalSeconds,
      goalText: `at most ${goalSeconds} s`,
    },
  ]
}

function timeOfRun(): number {
  const begin = performance.now()
  const run = findMethod('rc-snubber')?.run(inputs, tolerances)
  const seconds = (performance.now() - begin) / 1000
  if (!run?.ok || run.value.uncertainty?.draws !== 10_000) throw new Error('The run of the benchmark failed')
  return seconds
}
