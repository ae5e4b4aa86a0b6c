import 'server-only'

import { err, ok } from '@/lib/core/result'
import { channelFileOf } from '@/lib/ports/capture-analyser'
import { mostSpectrumSamples } from '@/lib/ports/spectrum-computer'

import { operation } from '../operation'
import { captureSpectrumSchema } from './capture-spectrum.schema'
import { evidenceFor, loadCapture } from './evidence-resource'
import { noSuchChannel, notACapture, notAVoltage, partTooLong } from './evidence.errors'
import { spectrumFigure, spectrumRemark } from './spectrum-figure'

/** The amplitude spectrum of a part of one channel, as a figure with what was used to make it. */
export const captureSpectrum = operation(
  'evidence.captureSpectrum',
  captureSpectrumSchema,
  async (deps, actor, input) => {
    const evidence = await evidenceFor(deps.db, actor, 'evidence.read', input.evidenceId)
    if (!evidence.ok) return evidence
    const capture = await loadCapture(deps.db, input.evidenceId)
    if (!capture) return err(notACapture)
    const channel = capture.channels[input.channel]
    if (!channel) return err(noSuchChannel(input.channel))
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
