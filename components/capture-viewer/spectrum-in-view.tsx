'use client'

import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'

import type { TimeWindow } from '@/lib/figure/time-window'

import { FigureSvg } from '../charts/figure-svg'
import { Button } from '../ui/button'
import { Notice } from '../ui/notice'
import { Skeleton } from '../ui/skeleton'
import { fetchSpectrum, spectrumWindows, type SpectrumWindow } from './fetch-spectrum'
import type { TraceSource } from './viewed-capture'

type SpectrumInViewProps = {
  readonly sources: readonly TraceSource[]
  readonly view: TimeWindow
}

/** The amplitude spectrum of what is in view, of the first line that is shown. */
export const SpectrumInView = ({ sources, view }: SpectrumInViewProps) => {
  const [isOpen, open] = useState(false)
  const [window, chooseWindow] = useState<SpectrumWindow>('hann')
  const source = sources.find(({ minus }) => minus === null)
  const fetched = useQuery({
    queryKey: ['capture-spectrum', source?.key, view.from, view.to, window],
    queryFn: ({ signal }) => (source ? fetchSpectrum(source, view, window, signal) : null),
    enabled: isOpen && source !== undefined,
    staleTime: Infinity,
  })
  if (!source) return null
  if (!isOpen) {
    return (
      <div>
        <Button size="small" onClick={() => open(true)}>
          Spectrum of what is in view
        </Button>
      </div>
    )
  }
  return (
    <section
      aria-label="Spectrum of what is in view"
      className="flex flex-col gap-3 border-t border-rule pt-4"
    >
      <div className="flex flex-wrap items-center gap-3">
        <label className="flex items-center gap-2 text-sm">
          Window
          <select
            value={window}
            onChange={(event) => chooseWindow(event.currentTarget.value as SpectrumWindow)}
            className="entry min-h-8 w-auto py-0.5"
          >
            {Object.entries(spectrumWindows).map(([value, label]) => (
              <option key={value} value={value}>
                {label}
              </option>
            ))}
          </select>
        </label>
        <Button size="small" onClick={() => open(false)}>
          Close the spectrum
        </Button>
      </div>
      {fetched.error ? (
        <Notice tone="error" title="The spectrum cannot be shown" live>
          {fetched.error.message}
        </Notice>
      ) : fetched.data ? (
        <>
          <p className="text-sm text-ink-soft">{fetched.data.remark}</p>
          <FigureSvg figure={fetched.data.figure} />
        </>
      ) : (
        <Skeleton label="Computing the spectrum" lines={6} />
      )}
    </section>
  )
}
