import type { PdfFileError } from '../pdf/read-pdf-file'

export type SignPdfError =
  | PdfFileError
  | {
      readonly code:
        | 'field_exists'
        | 'no_such_page'
        | 'block_taken'
        | 'block_outside_page'
        | 'block_too_small'
        | 'character_missing'
        | 'certificate_unusable'
      readonly message: string
    }
