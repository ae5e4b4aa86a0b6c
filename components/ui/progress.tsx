import { useId, type ReactNode } from 'react'

type ProgressProps = {
  readonly label: ReactNode
  /** Done so far, in the same unit as `max`. */
  readonly value: number
  readonly max: number
  /** Written amounts, e.g. "12.4 MB of 31.0 MB". */
  readonly amount?: ReactNode
  readonly speed?: ReactNode
  readonly timeLeft?: ReactNode
}

/** How far a piece of work has come: a share, and where known its speed and the time left. */
export const Progress = ({ label, value, max, amount, speed, timeLeft }: ProgressProps) => {
  const id = useId()
  const percent = max > 0 ? Math.min(100, Math.floor((100 * value) / max)) : 0
  return (
    <div className="flex flex-col gap-1">
      <div className="flex flex-wrap justify-between gap-x-4 text-sm">
        <label htmlFor={id} className="min-w-0 cursor-default font-semibold [overflow-wrap:anywhere]">
          {label}
        </label>
        <span className="num">
          {percent}
          <span className="unit">{'\u00a0%'}</span>
        </span>
      </div>
      <progress id={id} className="progress-bar" value={percent} max={100} />
      {amount || speed || timeLeft ? (
        <div className="flex flex-wrap gap-x-4 text-sm text-ink-soft">
          {amount ? <span>{amount}</span> : null}
          {speed ? <span>{speed}</span> : null}
          {timeLeft ? <span className="ml-auto">{timeLeft}</span> : null}
        </div>
      ) : null}
    </div>
  )
}
