import { Text, View } from '@react-pdf/renderer'

import type { ReportDocument, ReportRun } from '@/lib/core/report/report-document'

import { inOutline } from '../outline'
import { colours, styles } from '../styles'
import { Section } from './section'
import { ValueTable } from './value-table'

const Lines = ({ label, lines }: { readonly label: string; readonly lines: readonly string[] }) =>
  lines.length === 0 ? null : (
    <View style={{ marginBottom: 4 }}>
      <Text style={{ ...styles.strong, ...styles.small, ...styles.soft }} minPresenceAhead={20}>
        {label}
      </Text>
      {lines.map((line, index) => (
        <Text key={index} style={styles.small}>
          {line}
        </Text>
      ))}
    </View>
  )

const Run = ({ run }: { readonly run: ReportRun }) => (
  <View id={`run-${run.number}`} {...inOutline(`Run ${run.number}`)} style={{ marginBottom: 10 }}>
    <Text style={styles.subheading} minPresenceAhead={60}>
      Run {run.number}: {run.title}
    </Text>
    <Text style={{ ...styles.small, ...styles.soft, marginBottom: 4 }}>
      Method {run.methodId}, version {run.methodVersion}
    </Text>
    {run.formulas.map((formula, index) => (
      <Text key={index} style={{ ...styles.number, fontSize: 8.5 }}>
        {formula}
      </Text>
    ))}
    <View style={{ height: 4 }} />
    <ValueTable head="Inputs" rows={run.inputs} />
    <ValueTable head="Results, every step" rows={run.results} />
    <View style={{ marginBottom: 4 }}>
      {run.validity.map((check) => (
        <Text
          key={check.sentence}
          style={{ ...styles.small, color: check.passed ? colours.inkSoft : colours.overLimit }}
        >
          {check.passed ? 'Holds: ' : 'Does not hold: '}
          {check.sentence}
        </Text>
      ))}
    </View>
    <Lines label="Notes" lines={run.notes} />
    <Lines label="Cautions" lines={run.cautions} />
    <Lines label="Sources" lines={run.sources} />
  </View>
)

/** Formula, source, inputs and every result of each run, so that a reader can compute it again. */
export const MethodAppendix = ({ runs }: { readonly runs: ReportDocument['runs'] }) => (
  <Section title="Methods and runs">
    {runs.map((run) => (
      <Run key={run.number} run={run} />
    ))}
  </Section>
)
