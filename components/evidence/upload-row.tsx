import { byteSizeInWords } from '@/lib/core/byte-size'

import { Button } from '../ui/button'
import { Progress } from '../ui/progress'
import { StatusMark } from '../ui/status-mark'
import { TextLink } from '../ui/text-link'
import { paceOf, secondsInWords, type Upload } from './upload-state'

type UploadRowProps = {
  readonly upload: Upload
  readonly engagementId: string
  readonly onRetry: () => void
  readonly onDismiss: () => void
}

export const UploadRow = ({ upload, engagementId, onRetry, onDismiss }: UploadRowProps) => (
  <li className="border-b border-rule py-3 last:border-b-0">
    {upload.state.phase === 'sending' ? (
      <Sending upload={upload} />
    ) : (
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
        <span className="min-w-0 font-semibold [overflow-wrap:anywhere]">{upload.file.name}</span>
        <Outcome upload={upload} engagementId={engagementId} onDismiss={onDismiss} />
      </div>
    )}
    {upload.state.phase === 'refused' || upload.state.phase === 'failed' ? (
      <Refusal message={upload.state.message} onRetry={onRetry} onDismiss={onDismiss} />
    ) : null}
  </li>
)

const Sending = ({ upload }: { readonly upload: Upload }) => {
  const { state, file } = upload
  const sentBytes = state.phase === 'sending' ? state.sentBytes : 0
  const pace = paceOf(state, file.size)
  return (
    <Progress
      label={file.name}
      value={sentBytes}
      max={file.size}
      amount={`${byteSizeInWords(sentBytes)} of ${byteSizeInWords(file.size)}`}
      speed={pace ? `${byteSizeInWords(pace.speed)}/s` : undefined}
      timeLeft={pace ? `${secondsInWords(pace.secondsLeft)} left` : undefined}
    />
  )
}

type OutcomeProps = Omit<UploadRowProps, 'onRetry'>

const Outcome = ({ upload, engagementId, onDismiss }: OutcomeProps) => {
  const { state } = upload
  switch (state.phase) {
    case 'waiting':
      return <StatusMark kind="waiting">Waits its turn</StatusMark>
    case 'checking':
    case 'sending':
      return <StatusMark kind="waiting">Sent, being checked</StatusMark>
    case 'done':
      return (
        <span className="flex flex-wrap items-baseline gap-x-4">
          <StatusMark kind="active">Taken in</StatusMark>
          <TextLink href={`/engagements/${engagementId}/evidence/${state.evidenceId}`}>Open it</TextLink>
          <Button tone="quiet" size="small" onClick={onDismiss} aria-label={`Clear ${upload.file.name}`}>
            Clear
          </Button>
        </span>
      )
    case 'refused':
      return (
        <StatusMark kind="over-limit">{state.evidenceId ? 'Kept, but not readable' : 'Refused'}</StatusMark>
      )
    case 'failed':
      return <StatusMark kind="over-limit">Not sent</StatusMark>
  }
}

type RefusalProps = Pick<UploadRowProps, 'onRetry' | 'onDismiss'> & { readonly message: string }

const Refusal = ({ message, onRetry, onDismiss }: RefusalProps) => (
  <div className="mt-1">
    <p className="max-w-measure text-sm">{message}</p>
    <div className="mt-2 flex gap-2">
      <Button tone="plain" size="small" onClick={onRetry}>
        Try again
      </Button>
      <Button tone="quiet" size="small" onClick={onDismiss}>
        Clear
      </Button>
    </div>
  </div>
)
