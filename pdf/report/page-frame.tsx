import { Page, Text, View } from '@react-pdf/renderer'
import type { ReactNode } from 'react'

import type { ReportDocument } from '@/lib/core/report/report-document'

import { families } from '../fonts'
import { colours, styles } from '../styles'

export type PaperSize = 'A4' | 'LETTER'

/** Heights in points. */
export const pageHeights: Record<PaperSize, number> = { A4: 841.89, LETTER: 792 }

type PageFrameProps = {
  readonly document: ReportDocument
  readonly size: PaperSize
  readonly bookmark?: string
  readonly children: ReactNode
}

const line = {
  position: 'absolute',
  left: 56,
  right: 56,
  flexDirection: 'row',
  fontSize: 8,
  lineHeight: 1.3,
} as const

/** What stands on every page: the report's identity at the head, page n of m at the foot. */
export const PageFrame = ({ document, size, bookmark, children }: PageFrameProps) => (
  <Page size={size} style={styles.page} {...(bookmark ? { bookmark } : {})}>
    <View
      fixed
      style={{
        ...line,
        top: 32,
        borderBottomWidth: 1.5,
        borderBottomColor: colours.copper,
        paddingBottom: 5,
      }}
    >
      <Text style={{ flex: 1, fontFamily: families.heading, fontWeight: 600, fontSize: 9.5 }}>
        {document.practice.name}
      </Text>
      <Text style={{ color: colours.inkSoft }}>
        Report {document.number}, revision {document.revision}
      </Text>
    </View>
    {children}
    <View
      fixed
      style={{
        ...line,
        top: pageHeights[size] - 46,
        borderTopWidth: 0.5,
        borderTopColor: colours.ruleStrong,
        paddingTop: 5,
      }}
    >
      <Text style={{ flex: 1, color: colours.inkSoft }}>
        Engineering estimates on the evidence listed; not a statement of conformity
      </Text>
      <Text
        style={{ color: colours.inkSoft }}
        render={({ pageNumber, totalPages }) => `Page ${pageNumber} of ${totalPages}`}
      />
    </View>
  </Page>
)
