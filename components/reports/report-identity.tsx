import { DescriptionList } from '../ui/description-list'
import { Hash } from '../ui/hash'
import { Sheet } from '../ui/sheet'
import { TextLink } from '../ui/text-link'
import { Timestamp } from '../ui/timestamp'

type ReportIdentityProps = {
  readonly number: string
  readonly revision: number
  readonly authorName: string
  readonly reviewerName: string | null
  readonly signatures: readonly { readonly role: string; readonly name: string; readonly signedAt: number }[]
  readonly checkCode: string
  readonly fileSha256: string | null
}

/** Who stands behind the report, and how anybody can check a copy of it. */
export const ReportIdentity = (report: ReportIdentityProps) => (
  <Sheet title="Identity">
    <DescriptionList
      items={[
        {
          term: 'Number',
          detail: <span className="num">{`${report.number}, revision ${report.revision}`}</span>,
        },
        { term: 'Author', detail: report.authorName },
        { term: 'Reviewer', detail: report.reviewerName ?? 'Not chosen yet' },
        ...report.signatures.map((signature) => ({
          key: signature.role,
          term: `Signed as ${signature.role}`,
          detail: (
            <>
              {signature.name}, <Timestamp instant={signature.signedAt} />
            </>
          ),
        })),
        ...(report.fileSha256
          ? [
              { term: 'Check code', detail: <span className="num">{report.checkCode}</span> },
              {
                term: 'SHA-256',
                detail: <Hash value={report.fileSha256} what="SHA-256 of the signed file" />,
              },
              { term: 'Check a copy', detail: <TextLink href="/check">Open the check page</TextLink> },
            ]
          : []),
      ]}
    />
  </Sheet>
)
