import { Text, View } from '@react-pdf/renderer'

import type { ReportValue } from '@/lib/core/report/report-document'

import { styles } from '../styles'

type Row = ReportValue & { readonly origin?: string }

/** Quantities: name, symbol, digits right-aligned in one column, unit beside them, and where the value came from. */
export const ValueTable = ({ head, rows }: { readonly head: string; readonly rows: readonly Row[] }) => {
  const hasOrigin = rows.some((row) => row.origin !== undefined)
  if (rows.length === 0) return null
  return (
    <View style={{ marginBottom: 6 }}>
      <View style={styles.headRow} minPresenceAhead={30}>
        <Text>{head}</Text>
      </View>
      {rows.map((row, index) => (
        <View key={index} style={styles.row} wrap={false}>
          <Text style={{ width: hasOrigin ? 128 : 210 }}>{row.label}</Text>
          <Text style={{ ...styles.number, ...styles.soft, width: 84 }}>{row.symbol}</Text>
          <View style={{ flexDirection: 'row', width: 104 }}>
            <Text style={{ ...styles.number, width: 66, textAlign: 'right' }}>{row.number}</Text>
            <Text style={{ ...styles.unit, width: 38, paddingLeft: 4 }}>{row.unit || ' '}</Text>
          </View>
          {hasOrigin ? (
            <Text style={{ ...styles.small, ...styles.soft, flex: 1 }}>{row.origin ?? ''}</Text>
          ) : null}
        </View>
      ))}
    </View>
  )
}
