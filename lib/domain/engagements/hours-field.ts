import { z } from 'zod'

const longestMinutes = 10_000 * 60

/** Minutes of "12", "7.5" or "7:30" (hours and minutes); null for anything else, zero or more than 10,000 hours. */
export function minutesFromHours(text: string): number | null {
  const clock = /^(\d{1,5}):([0-5]\d)$/.exec(text.trim())
  const decimal = /^\d{1,5}(?:[.,]\d{1,2})?$/.exec(text.trim())
  const minutes = clock
    ? Number(clock[1]) * 60 + Number(clock[2])
    : decimal
      ? Math.round(Number(decimal[0].replace(',', '.')) * 60)
      : 0
  return minutes > 0 && minutes <= longestMinutes ? minutes : null
}

export const hoursField = (label: string) =>
  z.string({ error: `${label} is needed.` }).transform((text, context) => {
    const minutes = minutesFromHours(text)
    if (minutes !== null) return minutes
    context.addIssue({ code: 'custom', message: `${label} is a number of hours, such as 12, 7.5 or 7:30.` })
    return z.NEVER
  })
