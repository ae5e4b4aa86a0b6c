import { open, rename } from 'node:fs/promises'

import { overviewOf } from '@/lib/core/waveform/overview'
import { overviewBeside } from '@/lib/ports/capture-analyser'

/** Writes the samples of a channel and, beside them, the overview that a long record is drawn from. */
export async function writeChannel(file: string, values: Float64Array): Promise<void> {
  await writeWhole(overviewBeside(file), overviewOf(values))
  await writeWhole(file, values)
}

/** Beside first, synchronised, then renamed: samples under their final name are always whole. */
async function writeWhole(file: string, values: Float64Array): Promise<void> {
  const unfinished = `${file}.part`
  const handle = await open(unfinished, 'w')
  try {
    await handle.writeFile(new Uint8Array(values.buffer, values.byteOffset, values.byteLength))
    await handle.sync()
  } finally {
    await handle.close()
  }
  await rename(unfinished, file)
}
