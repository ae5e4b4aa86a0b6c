export type FormFields = { [name: string]: string | FormFields }

/** Reads `a[b][0]=c` into nested objects; lists keep their positions as names. */
export function formFields(encoded: string): FormFields {
  const fields: FormFields = Object.create(null)
  for (const [name, value] of new URLSearchParams(encoded)) {
    const steps = name.split(/[[\]]+/).filter(Boolean)
    const last = steps.pop()
    if (last === undefined) continue
    let place = fields
    for (const step of steps) {
      const inner = place[step]
      const next: FormFields = typeof inner === 'object' ? inner : Object.create(null)
      place[step] = next
      place = next
    }
    place[last] = value
  }
  return fields
}
