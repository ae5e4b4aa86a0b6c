import { open } from 'node:fs/promises'

import { err, ok, type Result } from '@/lib/core/result'
import { cosineWindows, hann } from '@/lib/core/spectrum/cosine-window'
import { amplitudeSpectrum, spectrumLevels } from '@/lib/core/spectrum/record-spectrum'
import { thinSpectrum } from '@/lib/core/spectrum/thin-spectrum'
import type { SpectrumRefusal, ThinnedSpectrum } from '@/lib/ports/spectrum-computer'

export type SpectrumJob = {
  readonly path: string
  readonly first: number
  readonly count: number
  readonly intervalSeconds: number
  readonly windowId: string
}

const columns = 1500
const bytesPerSample = Float64Array.BYTES_PER_ELEMENT

/** Reads the samples of a job and gives their spectrum, thinned; runs in the worker thread. */
export async function computeSpectrum(job: SpectrumJob): Promise<Result<ThinnedSpectrum, SpectrumRefusal>> {
  const window = cosineWindows.find(({ id }) => id === job.windowId) ?? hann
  const spectrum = amplitudeSpectrum(await samplesOf(job), job.intervalSeconds, window)
  if (!spectrum.ok) return err({ code: 'not_computable', message: spectrum.error.message })
  const { binWidth, resolutionBandwidth, isWholePeriods, sampleCount } = spectrum.value
  return ok({
    ...thinSpectrum(spectrumLevels(spectrum.value), binWidth, columns),
    binWidth,
    resolutionBandwidth,
    windowName: spectrum.value.window.name,
    isWholePeriods,
    sampleCount,
  })
}

async function samplesOf({ path, first, count }: SpectrumJob): Promise<Float64Array> {
  const samples = new Float64Array(count)
  const file = await open(path)
  try {
    const bytes = new Uint8Array(samples.buffer)
    const { bytesRead } = await file.read(bytes, 0, bytes.byteLength, first * bytesPerSample)
    return samples.subarray(0, Math.floor(bytesRead / bytesPerSample))
  } finally {
    await file.close()
  }
}
