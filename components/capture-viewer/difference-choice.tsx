'use client'

import { useId, useState } from 'react'

import { Button } from '../ui/button'
import type { ViewedCapture, ViewedChannel } from './viewed-capture'

type DifferenceChoiceProps = {
  readonly capture: ViewedCapture
  readonly onAdd: (plus: ViewedChannel, minus: ViewedChannel) => void
}

/** The difference of two channels of one unit, such as of the two ends of a shunt. */
export const DifferenceChoice = ({ capture, onAdd }: DifferenceChoiceProps) => {
  const [plus, choosePlus] = useState(0)
  const [minus, chooseMinus] = useState(1)
  const [one, other] = [capture.channels[plus], capture.channels[minus]]
  const isPossible = one !== undefined && other !== undefined && one !== other && one.unit === other.unit
  return (
    <div
      role="group"
      aria-label="Difference of two channels"
      className="flex flex-wrap items-center gap-2 text-sm"
    >
      <ChannelSelect
        label="Channel to subtract from"
        channels={capture.channels}
        chosen={plus}
        onChoose={choosePlus}
      />
      <span aria-hidden="true">−</span>
      <ChannelSelect
        label="Channel to subtract"
        channels={capture.channels}
        chosen={minus}
        onChoose={chooseMinus}
      />
      <Button size="small" disabled={!isPossible} onClick={() => isPossible && onAdd(one, other)}>
        Show the difference
      </Button>
      {isPossible || capture.channels.length < 2 ? null : (
        <span className="text-ink-soft">Choose two channels of one unit.</span>
      )}
    </div>
  )
}

type ChannelSelectProps = {
  readonly label: string
  readonly channels: readonly ViewedChannel[]
  readonly chosen: number
  readonly onChoose: (index: number) => void
}

const ChannelSelect = ({ label, channels, chosen, onChoose }: ChannelSelectProps) => {
  const id = useId()
  return (
    <>
      <label htmlFor={id} className="sr-only">
        {label}
      </label>
      <select
        id={id}
        value={chosen}
        onChange={(event) => onChoose(Number(event.currentTarget.value))}
        className="entry min-h-8 w-auto py-0.5"
      >
        {channels.map((channel, index) => (
          <option key={channel.position} value={index}>
            {channel.name}
          </option>
        ))}
      </select>
    </>
  )
}
