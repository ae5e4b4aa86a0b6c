import { Text, View } from '@react-pdf/renderer'
import type { ReactNode } from 'react'

import { inOutline } from '../outline'
import { styles } from '../styles'

type SectionProps = {
  readonly title: string
  readonly id?: string
  readonly children: ReactNode
}

/** A section with its place in the outline; its heading never stands alone at the foot of a page. */
export const Section = ({ title, id, children }: SectionProps) => (
  <View {...(id ? { id } : {})} {...inOutline(title)}>
    <Text style={styles.heading} minPresenceAhead={60}>
      {title}
    </Text>
    {children}
  </View>
)

type LabelledProps = { readonly label: string; readonly children: string }

/** A short heading with its text; nothing where there is no text. */
export const Labelled = ({ label, children }: LabelledProps) =>
  children.trim() === '' ? null : (
    <View style={{ marginBottom: 5 }}>
      <Text style={{ ...styles.strong, ...styles.small, ...styles.soft }} minPresenceAhead={24}>
        {label}
      </Text>
      {children.split('\n').map((paragraph, index) => (
        <Text key={index}>{paragraph}</Text>
      ))}
    </View>
  )
