/** Where one file stands on its way in. */
export type UploadState =
  | { readonly phase: 'waiting' }
  | {
      readonly phase: 'sending'
      readonly sentBytes: number
      readonly startedAt: number
      readonly now: number
    }
  | { readonly phase: 'checking' }
  | { readonly phase: 'done'; readonly evidenceId: string }
  | { readonly phase: 'refused'; readonly message: string; readonly evidenceId: string | null }
  | { readonly phase: 'failed'; readonly message: string }

export type Upload = { readonly key: number; readonly file: File; readonly state: UploadState }

export const isUnderWay = ({ state }: Upload): boolean =>
  state.phase === 'waiting' || state.phase === 'sending' || state.phase === 'checking'

/** Bytes a second since the first byte, and the seconds that the rest will take at that speed. */
export function paceOf(state: UploadState, sizeBytes: number): { speed: number; secondsLeft: number } | null {
  if (state.phase !== 'sending') return null
  const seconds = (state.now - state.startedAt) / 1000
  if (seconds < 0.5 || state.sentBytes === 0) return null
  const speed = state.sentBytes / seconds
  return { speed, secondsLeft: (sizeBytes - state.sentBytes) / speed }
}

/** "12 s", "3 min 20 s", "1 h 5 min". */
export function secondsInWords(seconds: number): string {
  const whole = Math.max(1, Math.ceil(seconds))
  if (whole < 60) return `${whole}\u00a0s`
  const minutes = Math.floor(whole / 60)
  if (minutes < 60) return `${minutes}\u00a0min ${whole % 60}\u00a0s`
  return `${Math.floor(minutes / 60)}\u00a0h ${minutes % 60}\u00a0min`
}
