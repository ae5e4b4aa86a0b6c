import type { EvidenceDto } from '@/lib/domain/evidence/evidence-dto'

import { DataTable } from '../ui/data-table'
import { Hash } from '../ui/hash'
import { TextLink } from '../ui/text-link'
import { Timestamp } from '../ui/timestamp'
import { ByteSize } from './byte-size'
import { EvidenceStatus } from './evidence-status'

const kinds: Record<EvidenceDto['kind'], string> = {
  capture: 'Capture',
  document: 'Document',
  picture: 'Picture',
  attachment: 'Attachment',
}

type EvidenceTableProps = {
  readonly files: readonly EvidenceDto[]
  /** Fewer columns, for a table beside other things. */
  readonly brief?: boolean | undefined
}

export const EvidenceTable = ({ files, brief = false }: EvidenceTableProps) => (
  <DataTable
    caption="Evidence, newest first"
    captionHidden
    rows={files}
    rowKey={(file) => file.evidenceId}
    columns={[
      {
        key: 'number',
        header: 'No.',
        align: 'end',
        cell: (file) => <span className="num">{file.number}</span>,
      },
      { key: 'name', header: 'File', isRowHeader: true, cell: (file) => <FileName file={file} /> },
      { key: 'kind', header: 'Kind', cell: (file) => kinds[file.kind] },
      { key: 'status', header: 'State', cell: (file) => <EvidenceStatus status={file.status} /> },
      { key: 'size', header: 'Size', align: 'end', cell: (file) => <ByteSize bytes={file.sizeBytes} /> },
      {
        key: 'when',
        header: 'Sent',
        cell: (file) => <Timestamp instant={file.uploadedAt} dayOnly={brief} />,
      },
      ...(brief
        ? []
        : [
            { key: 'who', header: 'By', cell: (file: EvidenceDto) => file.uploadedBy },
            {
              key: 'hash',
              header: 'SHA-256',
              cell: (file: EvidenceDto) => (
                <span className="block min-w-60">
                  <Hash value={file.sha256} what={`SHA-256 of ${file.name}`} />
                </span>
              ),
            },
          ]),
    ]}
  />
)

const FileName = ({ file }: { readonly file: EvidenceDto }) => (
  <TextLink
    href={`/engagements/${file.engagementId}/evidence/${file.evidenceId}`}
    className="inline-block min-w-36 [overflow-wrap:anywhere]"
  >
    {file.name}
  </TextLink>
)
