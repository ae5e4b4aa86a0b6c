'use client'

import { useEffect, useState } from 'react'

import type { TimeWindow } from '@/lib/figure/time-window'

import type { CaptureTrace } from './capture-points'
import { differenceText, frequencyText, instantText, levelDifferenceText, levelText } from './capture-text'

type CaptureReadoutProps = {
  readonly traces: readonly CaptureTrace[]
  readonly cursors: TimeWindow
}

/** Says a sentence once the cursors have come to rest, so that holding a key does not flood the speech. */
const useSettled = (text: string): string => {
  const [settled, setSettled] = useState('')
  useEffect(() => {
    const timer = setTimeout(() => setSettled(text), 600)
    return () => clearTimeout(timer)
  }, [text])
  return settled
}

const cell = 'px-3 py-1 text-right align-baseline first:pl-0'

/** Where the two cursors stand, the levels of every trace there, their distance and the frequency it makes. */
export const CaptureReadout = ({ traces, cursors }: CaptureReadoutProps) => {
  const difference = differenceText(cursors)
  const frequency = frequencyText(cursors)
  const spoken = useSettled(`Distance between the cursors ${difference}, one over it ${frequency}`)
  return (
    <>
      <div role="region" aria-label="Cursors" tabIndex={0} className="overflow-x-auto border-y border-rule">
        <table className="border-collapse text-sm">
          <thead>
            <tr className="text-ink-soft">
              <td className={cell} />
              <th scope="col" className={`${cell} font-semibold`}>
                A
              </th>
              <th scope="col" className={`${cell} font-semibold`}>
                B
              </th>
              <th scope="col" className={`${cell} font-semibold`}>
                B − A
              </th>
              <th scope="col" className={`${cell} font-semibold`}>
                1/(B − A)
              </th>
            </tr>
          </thead>
          <tbody className="num">
            <tr>
              <th scope="row" className={`${cell} text-left font-sans font-normal text-ink-soft`}>
                Time
              </th>
              <td className={cell}>{instantText(cursors.from)}</td>
              <td className={cell}>{instantText(cursors.to)}</td>
              <td className={cell}>{difference}</td>
              <td className={cell}>{frequency}</td>
            </tr>
            {traces.map(({ key, label, points, unit }) => (
              <tr key={key}>
                <th scope="row" className={`${cell} text-left font-sans font-normal text-ink-soft`}>
                  {label}
                </th>
                <td className={cell}>{levelText(points, cursors.from, unit)}</td>
                <td className={cell}>{levelText(points, cursors.to, unit)}</td>
                <td className={cell}>{levelDifferenceText(points, cursors, unit)}</td>
                <td className={cell} />
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p role="status" className="sr-only">
        {spoken}
      </p>
    </>
  )
}
