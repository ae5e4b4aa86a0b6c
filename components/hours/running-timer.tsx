import { Sheet } from '../ui/sheet'
import { Timestamp } from '../ui/timestamp'

type RunningTimerProps = { readonly text: string; readonly startedAt: number }

/** Why no second timer can be started, and where the first one is stopped. */
export const RunningTimer = ({ text, startedAt }: RunningTimerProps) => (
  <Sheet title="Your timer runs">
    <p className="font-semibold [overflow-wrap:anywhere]">{text}</p>
    <p className="text-sm text-ink-soft">
      Since <Timestamp instant={startedAt} />. Stop it at the head of the page; what it measured becomes a
      draft here.
    </p>
  </Sheet>
)
