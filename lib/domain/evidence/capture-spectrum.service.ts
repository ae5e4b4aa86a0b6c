import 'server-only'

import { err, ok } from '@/lib/core/result'
import { channelFileOf } from '@/lib/ports/capture-analyser'
import { mostSpectrumSamples } from '@/lib/ports/spectrum-computer'

import { operation } from '../operation'
import { captureChannelFor } from './capture-channel'
import { captureSpectrumSchema } from './capture-spectrum.schema'
import { notAVoltage, partTooLong } from './evidence.errors'
import { spectrumFigure, spectrumRemark } from './spectrum-figure'

/** The amplitude spectrum of a part of one channel, as a figure with what was used to make it. */
export const captureSpectrum = operation(
  'evidence.captureSpectrum',
  captureSpectrumSchema,
  async (deps, actor, input) => {
    const found = await captureChannelFor(deps.db, actor, input.evidenceId, input.channel)
    if (!found.ok) return found
    const { capture, channel } = found.value
    if (channel.unit !== 'V') return err(notAVoltage(channel.name))
    const indexAt = (instant: number) =>
      Math.min(
        capture.samples - 1,
        Math.max(0, Math.round((instant - capture.startSeconds) / capture.intervalSeconds)),
      )
    const first = indexAt(input.from)
    const count = indexAt(input.to) - first + 1
    if (count > mostSpectrumSamples) return err(partTooLong(mostSpectrumSamples))
    const spectrum = await deps.spectra.compute({
      fileId: channelFileOf(input.evidenceId, input.channel),
      first,
      count,
      intervalSeconds: capture.intervalSeconds,
      windowId: input.window,
    })
    if (!spectrum.ok) return spectrum
    return ok({
      figure: spectrumFigure(channel.name, spectrum.value),
      remark: spectrumRemark(spectrum.value),
    })
  },
)
