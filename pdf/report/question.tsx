import { Text, View } from '@react-pdf/renderer'

import type { ReportDocument } from '@/lib/core/report/report-document'

import { styles } from '../styles'
import { FactTable } from './fact-table'
import { dayText, grouped } from './print-text'
import { Labelled, Section } from './section'

/** What was asked, of which product, under which conditions. */
export const Question = ({ engagement }: { readonly engagement: ReportDocument['engagement'] }) => (
  <Section title="Question asked">
    <Labelled label="Agreed scope">{engagement.scope}</Labelled>
    <FactTable
      facts={[
        { label: 'Received', value: dayText(engagement.openedAt) },
        { label: 'Product', value: engagement.product },
        { label: 'Goal', value: engagement.goal },
        { label: 'Symptom', value: engagement.symptom },
        ...engagement.operatingPoint,
        ...engagement.oscillators,
        ...(engagement.alreadyTried ? [{ label: 'Tried before', value: engagement.alreadyTried }] : []),
      ]}
    />
  </Section>
)

/** The files that the findings rest on, as they were received. */
export const Evidence = ({ evidence }: { readonly evidence: ReportDocument['evidence'] }) => (
  <Section title="Evidence reviewed">
    <Text style={styles.paragraph}>
      The results relate only to these files. Each is named by its SHA-256, taken while it was received.
    </Text>
    {evidence.map((item) => (
      <View key={item.number} id={`evidence-${item.number}`} style={{ marginBottom: 8 }} wrap={false}>
        <Text style={styles.subheading} minPresenceAhead={40}>
          E{item.number} {item.name}
        </Text>
        <Text style={{ ...styles.number, fontSize: 7.5 }}>{item.sha256}</Text>
        <Text style={{ ...styles.small, ...styles.soft }}>
          {grouped(item.sizeBytes)} bytes, received {dayText(item.receivedAt)}
        </Text>
        <FactTable facts={item.facts} />
        {item.missing.map((sentence) => (
          <Text key={sentence} style={{ ...styles.small, marginBottom: 2 }}>
            Not stated: {sentence}
          </Text>
        ))}
      </View>
    ))}
  </Section>
)
