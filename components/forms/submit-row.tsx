import { Button } from '../ui/button'

type SubmitRowProps = {
  readonly label: string
  readonly pendingLabel: string
  readonly isPending: boolean
  readonly tone?: 'primary' | 'plain' | 'quiet' | undefined
  readonly size?: 'normal' | 'small' | undefined
}

export const SubmitRow = ({ label, pendingLabel, isPending, tone = 'primary', size }: SubmitRowProps) => (
  <div>
    <Button type="submit" tone={tone} size={size} aria-disabled={isPending || undefined}>
      {isPending ? pendingLabel : label}
    </Button>
  </div>
)
