import { Text, View } from '@react-pdf/renderer'

import type { ReportDocument } from '@/lib/core/report/report-document'

import { families } from '../fonts'
import { colours, styles } from '../styles'
import { FactTable } from './fact-table'
import { instantText } from './print-text'
import { Labelled, Section } from './section'

/** Title, identity and the summary for somebody who decides. */
export const Opening = ({ document }: { readonly document: ReportDocument }) => (
  <View>
    <Text
      style={{ fontFamily: families.heading, fontWeight: 600, fontSize: 23, lineHeight: 1.2, marginTop: 8 }}
    >
      {document.title}
    </Text>
    <Text style={{ ...styles.soft, fontSize: 11, lineHeight: 1.4, marginTop: 4, marginBottom: 12 }}>
      For {document.clientCompany}, engagement {document.engagement.number}: {document.engagement.title}
    </Text>
    <FactTable
      facts={[
        { label: 'Report', value: `${document.number}, revision ${document.revision}` },
        { label: 'Content frozen', value: instantText(document.issuedAt) },
        { label: 'Author', value: document.author },
        { label: 'Reviewer', value: document.reviewer },
        {
          label: 'Practice',
          value: [document.practice.name, document.practice.address].filter(Boolean).join(', '),
        },
        { label: 'Check this file', value: `${document.checkAddress}, code ${document.checkCode}` },
      ]}
    />
    <Section title="Summary">
      <View
        style={{
          backgroundColor: colours.wash,
          borderLeftWidth: 3,
          borderLeftColor: colours.copper,
          padding: 10,
        }}
      >
        <Labelled label="What we believe">{document.summary.belief}</Labelled>
        <Labelled label="How sure we are">{document.summary.certainty}</Labelled>
        <Labelled label="What to do next">{document.summary.nextStep}</Labelled>
      </View>
    </Section>
  </View>
)
