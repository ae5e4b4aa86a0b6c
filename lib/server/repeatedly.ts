import 'server-only'

/**
 * Runs `work` at once and then `interval` milliseconds after each round has ended, so that two rounds never overlap.
 * A round that throws is told to `failed`, and the next one comes all the same.
 * @returns what stops it.
 */
export function repeatedly(
  interval: number,
  work: () => Promise<unknown>,
  failed: (error: unknown) => void,
): () => void {
  let isStopped = false
  const round = async () => {
    await work().catch(failed)
    // A waiting round does not keep the process alive.
    if (!isStopped) setTimeout(() => void round(), interval).unref()
  }
  void round()
  return () => {
    isStopped = true
  }
}
