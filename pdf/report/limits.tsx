import { Text, View } from '@react-pdf/renderer'

import type { ReportDocument } from '@/lib/core/report/report-document'

import { styles } from '../styles'
import { dayText, durationText } from './print-text'
import { Section } from './section'

const cautions = [
  'Switch nodes and mains-referenced circuits can injure. Use isolated or differential probes, switch off and discharge before touching, and let only qualified people do it.',
  'Snubber resistors and clamp parts run hot. Check their temperature at the highest input voltage before they are left alone.',
  'Every recommended change is to be verified on the product, under the same set-up as before, and at its limits of voltage, load and temperature.',
]

const limits = [
  'The results relate only to the evidence listed and to the conditions stated with it.',
  'They are engineering estimates. They are not a statement of conformity and not a certificate: that is for an accredited laboratory under the standard and edition in force. Local codes and licensed practice come first.',
  'This report may be shown to others whole and unchanged. The signatures show whether a copy is.',
]

const Sentences = ({ sentences }: { readonly sentences: readonly string[] }) => (
  <View>
    {sentences.map((sentence) => (
      <Text key={sentence} style={styles.paragraph}>
        {sentence}
      </Text>
    ))}
  </View>
)

/** What the report does not say, what to take care of, the time spent, and how the report came about. */
export const Limits = ({ document }: { readonly document: ReportDocument }) => (
  <View>
    <Section title="Validity and limits">
      <Sentences sentences={limits} />
    </Section>
    <Section title="Cautions">
      <Sentences sentences={cautions} />
    </Section>
    <Section title="Hours and revisions">
      <Text style={styles.paragraph}>
        Time posted to this engagement when the content was frozen: {durationText(document.minutesUsed)}.
      </Text>
      {document.revisions.map((revision) => (
        <View key={revision.revision} style={styles.row} wrap={false}>
          <Text style={{ width: 70 }}>Revision {revision.revision}</Text>
          <Text style={{ width: 110 }}>{dayText(revision.date)}</Text>
          <Text style={{ flex: 1 }}>{revision.change}</Text>
        </View>
      ))}
    </Section>
  </View>
)
