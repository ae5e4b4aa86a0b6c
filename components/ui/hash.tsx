import { CopyButton } from './copy-button'

type HashProps = {
  /** The full value in hexadecimal. */
  readonly value: string
  /** What it is the hash of, e.g. "SHA-256 of scan.csv". */
  readonly what: string
  /** Show all digits instead of the first and last few. */
  readonly full?: boolean | undefined
}

/** A hash: short for the eye, whole for copying and for assistive technology. */
export const Hash = ({ value, what, full = false }: HashProps) => (
  <span className="inline-flex max-w-full flex-wrap items-baseline gap-x-1">
    {full ? (
      <code className="num whitespace-normal [overflow-wrap:anywhere]">{value}</code>
    ) : (
      <code className="num" title={value}>
        <span aria-hidden="true">{`${value.slice(0, 10)}…${value.slice(-6)}`}</span>
        <span className="sr-only">{value}</span>
      </code>
    )}
    <CopyButton value={value} what={what} />
  </span>
)
