const steps = ['bytes', 'KiB', 'MiB', 'GiB', 'TiB'] as const

/** "312 bytes", "1.5 MiB": binary prefixes as in IEC 80000-13, three digits. */
export function byteSizeInWords(bytes: number): string {
  if (bytes === 1) return '1\u00a0byte'
  let value = bytes
  let step = 0
  while (value >= 1024 && step < steps.length - 1) {
    value /= 1024
    step += 1
  }
  const digits = step === 0 ? 0 : value < 10 ? 2 : value < 100 ? 1 : 0
  return `${value.toFixed(digits)}\u00a0${steps[step] ?? ''}`
}
