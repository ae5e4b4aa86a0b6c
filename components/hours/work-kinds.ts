/** The kinds of work that time is posted to. */
export const workKinds = [
  { value: 'measurement', label: 'Measurement' },
  { value: 'analysis', label: 'Analysis' },
  { value: 'layout_review', label: 'Layout review' },
  { value: 'reporting', label: 'Reporting' },
  { value: 'review', label: 'Review' },
  { value: 'meeting', label: 'Meeting' },
] as const

export const workKindLabel = (value: string): string =>
  workKinds.find((kind) => kind.value === value)?.label ?? value
