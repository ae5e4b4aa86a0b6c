import type { EvidenceDto } from '@/lib/domain/evidence/evidence-dto'

import { buttonClass } from '../ui/button-class'
import { DescriptionList } from '../ui/description-list'
import { Hash } from '../ui/hash'
import { Sheet } from '../ui/sheet'
import { Timestamp } from '../ui/timestamp'
import { ByteSize } from './byte-size'
import { EvidenceStatus } from './evidence-status'

export const FileDetails = ({ file }: { readonly file: EvidenceDto }) => (
  <Sheet
    title="File"
    actions={
      <a href={`/api/evidence/${file.evidenceId}/file`} download className={buttonClass('plain', 'small')}>
        Download
      </a>
    }
  >
    <DescriptionList
      items={[
        { term: 'State', detail: <EvidenceStatus status={file.status} /> },
        { term: 'Size', detail: <ByteSize bytes={file.sizeBytes} /> },
        { term: 'Sent by', detail: file.uploadedBy },
        { term: 'Sent', detail: <Timestamp instant={file.uploadedAt} /> },
        { term: 'SHA-256', detail: <Hash value={file.sha256} what={`SHA-256 of ${file.name}`} full /> },
      ]}
    />
  </Sheet>
)
