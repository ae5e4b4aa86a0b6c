import { execFile } from 'node:child_process'
import { promisify } from 'node:util'

import { z } from 'zod'

import { transformReal } from '@/lib/core/fourier/real-transform'

import { pythonWithScipy } from '../python'
import type { BenchLine } from './bench-line'

const run = promisify(execFile)

const lengths = [2 ** 20, 2 ** 22] as const

/** The best of so many repeats: what the machine can do when nothing else runs. */
const repeats = 15

/** Rounds of both in turn, so that a busy moment does not fall on one of them alone. */
const rounds = 3

const goal = 1.5

/** A real transform of a million and of four million values beside that of numpy, on one core, in the same run. */
export const fourierBench = async (): Promise<readonly BenchLine[]> => {
  const best = lengths.map((length) => ({ length, ours: Infinity, numpy: Infinity }))
  for (let round = 0; round < rounds; round += 1) {
    for (const line of best) {
      line.ours = Math.min(line.ours, bestOfOurs(line.length))
      line.numpy = Math.min(line.numpy, await bestOfNumpy(line.length))
    }
  }
  return best.map(({ length, ours, numpy }) => ({
    name: `Real Fourier transform of 2^${Math.log2(length)} values`,
    value: ours,
    unit: 'ms',
    reference: numpy,
    goal,
    goalText: `at most ${goal} times numpy.fft.rfft`,
  }))
}

const valueAt = (index: number): number => Math.sin(0.1 * index) + 0.1 * Math.cos(0.377 * index)

function bestOfOurs(length: number): number {
  const values = Float64Array.from({ length }, (_, index) => valueAt(index))
  let best = Infinity
  for (let repeat = 0; repeat < repeats; repeat += 1) {
    const start = performance.now()
    transformReal(values)
    best = Math.min(best, performance.now() - start)
  }
  return best
}

const script = `
import sys, time, numpy as np
n, repeats = int(sys.argv[1]), int(sys.argv[2])
i = np.arange(n)
x = np.sin(0.1 * i) + 0.1 * np.cos(0.377 * i)
best = float('inf')
for _ in range(repeats):
    start = time.perf_counter()
    np.fft.rfft(x)
    best = min(best, time.perf_counter() - start)
print(best * 1e3)
`

async function bestOfNumpy(length: number): Promise<number> {
  const { stdout } = await run(pythonWithScipy() ?? 'python3', [
    '-c',
    script,
    String(length),
    String(repeats),
  ])
  return z.coerce.number().positive().parse(stdout.trim())
}
