'use client'

import { useEffect, useState } from 'react'

import type { TimeWindow } from '@/lib/figure/time-window'

import type { CapturePoints } from './capture-points'
import { differenceText, frequencyText, instantText, levelText } from './capture-text'

type CaptureReadoutProps = {
  readonly points: CapturePoints
  readonly cursors: TimeWindow
  readonly unit: string
}

const Entry = ({ term, detail }: { readonly term: string; readonly detail: string }) => (
  <div className="flex items-baseline gap-2">
    <dt className="text-sm text-ink-soft">{term}</dt>
    <dd className="num">{detail}</dd>
  </div>
)

/** Says a sentence once the cursors have come to rest, so that holding a key does not flood the speech. */
const useSettled = (text: string): string => {
  const [settled, setSettled] = useState('')
  useEffect(() => {
    const timer = setTimeout(() => setSettled(text), 600)
    return () => clearTimeout(timer)
  }, [text])
  return settled
}

/** Where the two cursors stand, the levels there, their distance and the frequency it makes. */
export const CaptureReadout = ({ points, cursors, unit }: CaptureReadoutProps) => {
  const difference = differenceText(cursors)
  const frequency = frequencyText(cursors)
  const spoken = useSettled(`Distance between the cursors ${difference}, one over it ${frequency}`)
  return (
    <>
      <dl className="flex flex-wrap gap-x-6 gap-y-1 border-y border-rule py-2">
        <Entry term="A" detail={`${instantText(cursors.from)}, ${levelText(points, cursors.from, unit)}`} />
        <Entry term="B" detail={`${instantText(cursors.to)}, ${levelText(points, cursors.to, unit)}`} />
        <Entry term="Δt" detail={difference} />
        <Entry term="1/Δt" detail={frequency} />
      </dl>
      <p role="status" className="sr-only">
        {spoken}
      </p>
    </>
  )
}
