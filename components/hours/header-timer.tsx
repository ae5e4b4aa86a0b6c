'use client'

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import Link from 'next/link'
import { useRouter } from 'next/navigation'
import { useEffect, useState } from 'react'

import { Button } from '../ui/button'
import { StatusMark } from '../ui/status-mark'
import { z } from '../shell/plain-zod'

const timerSchema = z
  .object({
    engagementId: z.string(),
    engagementTitle: z.string(),
    text: z.string(),
    startedAt: z.number(),
    now: z.number(),
  })
  .nullable()

type Timer = NonNullable<z.infer<typeof timerSchema>>

/** After this long without a stop somebody has probably forgotten it. */
const longMilliseconds = 4 * 60 * 60 * 1000

async function fetchTimer() {
  const response = await fetch('/api/timer')
  if (!response.ok) throw new Error('not answered')
  const timer = timerSchema.parse(await response.json())
  // The server's clock decides; the browser only counts on from its answer.
  return timer ? { ...timer, offset: timer.now - Date.now() } : null
}

type HeaderTimerProps = {
  /** The timer as the server knew it when it wrote the page; null when none runs. */
  readonly initial: Timer | null
}

/** The running timer in the header of every page: it survives a reload and warns after four hours. */
export const HeaderTimer = ({ initial }: HeaderTimerProps) => {
  const client = useQueryClient()
  const router = useRouter()
  const { data: timer } = useQuery({
    queryKey: ['timer', initial?.startedAt ?? null],
    queryFn: fetchTimer,
    initialData: initial ? { ...initial, offset: 0 } : null,
    refetchInterval: 30_000,
  })
  const stop = useMutation({
    mutationFn: async () => {
      const response = await fetch('/api/timer', { method: 'DELETE' })
      if (!response.ok && response.status !== 409) throw new Error('not stopped')
    },
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: ['timer'] })
      router.refresh()
    },
  })
  if (!timer) return null
  return (
    <div role="group" aria-label="Running timer" className="flex items-center gap-3 text-sm">
      <span className="min-w-0">
        <Link
          href={`/engagements/${timer.engagementId}/time`}
          className="text-link block max-w-48 truncate"
          title={timer.engagementTitle}
        >
          {timer.engagementTitle}
        </Link>
        <Elapsed startedAt={timer.startedAt - timer.offset} />
      </span>
      <Button size="small" onClick={() => stop.mutate()} aria-disabled={stop.isPending || undefined}>
        {stop.isError ? 'Try to stop again' : 'Stop'}
      </Button>
    </div>
  )
}

const Elapsed = ({ startedAt }: { readonly startedAt: number }) => {
  const [now, setNow] = useState<number | null>(null)
  useEffect(() => {
    const tick = () => setNow(Date.now())
    const first = setTimeout(tick, 0)
    const every = setInterval(tick, 1_000)
    return () => {
      clearTimeout(first)
      clearInterval(every)
    }
  }, [])
  if (now === null) return <span className="num">running</span>
  const seconds = Math.max(0, Math.floor((now - startedAt) / 1000))
  const isLong = seconds * 1000 >= longMilliseconds
  return (
    <span className="flex flex-wrap items-center gap-x-2">
      <span className="num">{clockText(seconds)}</span>
      {isLong ? <StatusMark kind="attention">Still working?</StatusMark> : null}
    </span>
  )
}

const two = (value: number): string => value.toString().padStart(2, '0')

const clockText = (seconds: number): string =>
  `${Math.floor(seconds / 3600)}:${two(Math.floor(seconds / 60) % 60)}:${two(seconds % 60)}`
