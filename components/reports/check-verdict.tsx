import { DescriptionList } from '../ui/description-list'
import { Hash } from '../ui/hash'
import { StatusMark } from '../ui/status-mark'
import { Timestamp } from '../ui/timestamp'
import type { CheckAnswer } from './request-check'

const words = {
  valid: { kind: 'verified', title: 'Valid: whole, unchanged, and signed by both' },
  invalid: { kind: 'over-limit', title: 'Invalid: this is not the file that was signed' },
  unknown: { kind: 'attention', title: 'Not one of our released reports' },
} as const

/** What the check found, in plain words. */
export const CheckVerdict = ({ checked }: { readonly checked: CheckAnswer }) => {
  const { kind, title } = words[checked.outcome]
  return (
    <section
      aria-label="Result of the check"
      className="rounded border border-rule-strong bg-ground px-5 py-4"
    >
      <h2 className="mb-3 text-xl">
        <StatusMark kind={kind}>{title}</StatusMark>
      </h2>
      {checked.problems.length > 0 ? (
        <ul className="mb-4 list-disc pl-5">
          {checked.problems.map((problem) => (
            <li key={problem}>{problem}</li>
          ))}
        </ul>
      ) : null}
      <DescriptionList
        items={[
          ...(checked.report
            ? [
                {
                  term: 'Report',
                  detail: (
                    <span className="num">{`${checked.report.number}, revision ${checked.report.revision}`}</span>
                  ),
                },
                { term: 'Standing', detail: checked.report.standing === 'current' ? 'Current' : 'Withdrawn' },
                { term: 'Released', detail: <Timestamp instant={checked.report.releasedAt} /> },
              ]
            : []),
          ...checked.signatures.map((signature) => ({
            key: signature.field,
            term: `Signature of the ${signature.field}`,
            detail: (
              <>
                {signature.signerName ?? 'Unreadable'}
                {signature.signedAt === null ? null : (
                  <>
                    , <Timestamp instant={signature.signedAt} />
                  </>
                )}
                {signature.passed ? '' : ' (does not hold)'}
              </>
            ),
          })),
          {
            term: 'SHA-256 of this file',
            detail: <Hash value={checked.sha256} what="SHA-256 of this file" full />,
          },
          ...(checked.authorityFingerprint
            ? [
                {
                  term: 'Authority of the practice',
                  detail: (
                    <Hash
                      value={checked.authorityFingerprint}
                      what="fingerprint of the practice’s authority"
                      full
                    />
                  ),
                },
              ]
            : []),
        ]}
      />
    </section>
  )
}
