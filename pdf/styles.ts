import { StyleSheet } from '@react-pdf/renderer'

import { families } from './fonts'

/** The notebook on white paper: ink blue, one copper accent, green for verified, oxide red for over the limit. */
export const colours = {
  ink: '#1b2a4a',
  inkSoft: '#415070',
  inkFaint: '#59647c',
  copper: '#9c4f22',
  rule: '#d9cdb3',
  ruleStrong: '#857a62',
  wash: '#faf6ec',
  verified: '#1d6a3a',
  overLimit: '#9e2b1b',
  paper: '#ffffff',
} as const

export const styles = StyleSheet.create({
  page: {
    paddingTop: 70,
    paddingBottom: 62,
    paddingHorizontal: 56,
    fontFamily: families.text,
    fontSize: 10,
    lineHeight: 1.4,
    color: colours.ink,
    backgroundColor: colours.paper,
  },
  heading: {
    fontFamily: families.heading,
    fontWeight: 600,
    fontSize: 15,
    lineHeight: 1.25,
    marginTop: 16,
    marginBottom: 6,
    paddingBottom: 3,
    borderBottomWidth: 0.75,
    borderBottomColor: colours.ruleStrong,
  },
  subheading: {
    fontFamily: families.heading,
    fontWeight: 600,
    fontSize: 11.5,
    lineHeight: 1.3,
    marginTop: 9,
    marginBottom: 2,
  },
  paragraph: { marginBottom: 5 },
  soft: { color: colours.inkSoft },
  small: { fontSize: 8.5, lineHeight: 1.35 },
  strong: { fontWeight: 600 },
  number: { fontFamily: families.number, fontSize: 9, lineHeight: 1.4 },
  unit: { fontFamily: families.text, fontSize: 9, color: colours.inkSoft },
  row: {
    flexDirection: 'row',
    gap: 10,
    paddingVertical: 2.5,
    borderBottomWidth: 0.5,
    borderBottomColor: colours.rule,
  },
  headRow: {
    flexDirection: 'row',
    gap: 10,
    paddingVertical: 3,
    borderBottomWidth: 0.75,
    borderBottomColor: colours.ruleStrong,
    fontWeight: 600,
    fontSize: 9,
  },
})
