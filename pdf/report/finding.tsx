import { Link, Text, View } from '@react-pdf/renderer'

import type { ReportDocument, ReportFinding } from '@/lib/core/report/report-document'

import { inOutline } from '../outline'
import { colours, styles } from '../styles'
import { ReportFigure } from './report-figure'
import { Labelled, Section } from './section'
import { ValueTable } from './value-table'

const link = { color: colours.copper, textDecoration: 'none' } as const

type FindingProps = { readonly finding: ReportFinding; readonly runs: ReportDocument['runs'] }

const Grounds = ({ finding }: { readonly finding: ReportFinding }) => (
  <Text style={{ ...styles.small, ...styles.soft, marginBottom: 4 }}>
    Rests on{' '}
    {finding.evidenceNumbers.map((number) => (
      <Link key={`e${number}`} src={`#evidence-${number}`} style={link}>
        evidence E{number},{' '}
      </Link>
    ))}
    {finding.runNumbers.map((number, index) => (
      <Link key={`r${number}`} src={`#run-${number}`} style={link}>
        run {number}
        {index < finding.runNumbers.length - 1 ? ', ' : ''}
      </Link>
    ))}
  </Text>
)

const Actions = ({ actions }: { readonly actions: ReportFinding['actions'] }) => (
  <View>
    {actions.map((action, index) => (
      <View key={index} style={styles.row} wrap={false}>
        <Text style={{ ...styles.number, width: 16 }}>{index + 1}</Text>
        <View style={{ flex: 1 }}>
          <Text style={styles.strong}>{action.instruction}</Text>
          {action.partValues ? <Text>Parts: {action.partValues}</Text> : null}
          {action.sideEffects ? <Text style={styles.soft}>Side effects: {action.sideEffects}</Text> : null}
        </View>
      </View>
    ))}
  </View>
)

const Finding = ({ finding, runs }: FindingProps) => {
  const results = runs.filter((run) => finding.runNumbers.includes(run.number))
  return (
    <View
      id={`finding-${finding.number}`}
      {...inOutline(`Finding ${finding.number}`)}
      style={{ marginBottom: 10 }}
    >
      <Text style={{ ...styles.subheading, fontSize: 13, marginTop: 12 }} minPresenceAhead={80}>
        {finding.number}. {finding.claim}
      </Text>
      <Text style={{ ...styles.small, ...styles.soft, marginBottom: 4 }}>
        Severity: {finding.severity}. Confidence: {finding.confidence}.
      </Text>
      <Grounds finding={finding} />
      <Labelled label="Reasoning">{finding.reasoning}</Labelled>
      {results.map((run) => (
        <ValueTable
          key={run.number}
          head={`Run ${run.number}: ${run.title}`}
          rows={run.results.filter((result) => result.isMain)}
        />
      ))}
      {finding.figures.map((figure, index) => (
        <ReportFigure key={index} figure={figure} number={`${finding.number}.${index + 1}`} />
      ))}
      <Labelled label="Other causes considered">{finding.alternativeCauses}</Labelled>
      <Labelled label="The experiment that would disprove it">{finding.disprovingExperiment}</Labelled>
      {finding.actions.length > 0 ? (
        <View>
          <Text style={styles.subheading} minPresenceAhead={30}>
            Recommended actions
          </Text>
          <Actions actions={finding.actions} />
        </View>
      ) : null}
    </View>
  )
}

export const Findings = ({ document }: { readonly document: ReportDocument }) => (
  <Section title="Findings">
    <Text style={{ ...styles.small, ...styles.soft }}>
      Opinions and interpretations of the practice, kept apart from the measured and computed values they rest
      on.
    </Text>
    {document.findings.map((finding) => (
      <Finding key={finding.number} finding={finding} runs={document.runs} />
    ))}
  </Section>
)
