import { Text, View } from '@react-pdf/renderer'

import type { Fact } from '@/lib/core/report/report-document'

import { styles } from '../styles'

/** Label and value, a rule between the pairs. */
export const FactTable = ({ facts }: { readonly facts: readonly Fact[] }) => (
  <View style={{ marginBottom: 6 }}>
    {facts.map((fact) => (
      <View key={fact.label} style={styles.row} wrap={false}>
        <Text style={{ ...styles.soft, width: 130 }}>{fact.label}</Text>
        <Text style={{ flex: 1 }}>{fact.value}</Text>
      </View>
    ))}
  </View>
)
