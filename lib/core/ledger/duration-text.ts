/** A span of minutes in words: "12 h 30 min", "45 min", "2 h". */
export function durationText(minutes: number): string {
  const hours = Math.floor(minutes / 60)
  const rest = minutes % 60
  const parts = [hours > 0 ? `${hours} h` : '', rest > 0 || hours === 0 ? `${rest} min` : '']
  return parts.filter(Boolean).join(' ')
}
