import { Text, View } from '@react-pdf/renderer'

import type { ReportDocument } from '@/lib/core/report/report-document'

import { colours, styles } from '../styles'
import { signatureBoxes, type SignatureRole } from './signature-boxes'
import { Section } from './section'

type BoxProps = {
  readonly role: SignatureRole
  readonly name: string
  readonly words: string
  readonly pageHeight: number
}

const Box = ({ role, name, words, pageHeight }: BoxProps) => {
  const box = signatureBoxes[role]
  const top = pageHeight - box.y - box.height
  return (
    <>
      <Text style={{ ...styles.strong, position: 'absolute', left: box.x, top: top - 34 }}>{name}</Text>
      <Text style={{ ...styles.small, ...styles.soft, position: 'absolute', left: box.x, top: top - 18 }}>
        {words}
      </Text>
      <View
        style={{
          position: 'absolute',
          left: box.x,
          top,
          width: box.width,
          height: box.height,
          borderWidth: 0.75,
          borderColor: colours.ruleStrong,
        }}
      />
    </>
  )
}

type SignaturePageProps = { readonly document: ReportDocument; readonly pageHeight: number }

/** The last page: two boxes that the digital signatures fill, and the mark of the report's end. */
export const SignaturePage = ({ document, pageHeight }: SignaturePageProps) => (
  <>
    <Section title="Signatures">
      <Text style={styles.paragraph}>
        Author and reviewer sign this file digitally. Open it at {document.checkAddress} with the code{' '}
        {document.checkCode} to see whether it is whole, unchanged and current.
      </Text>
    </Section>
    <Box role="author" name={document.author} words="Author of this report" pageHeight={pageHeight} />
    <Box role="reviewer" name={document.reviewer} words="Reviewer, not the author" pageHeight={pageHeight} />
    <Text
      style={{
        ...styles.soft,
        position: 'absolute',
        left: 56,
        right: 56,
        top: pageHeight - 400,
        textAlign: 'center',
      }}
    >
      End of report {document.number}, revision {document.revision}
    </Text>
  </>
)
