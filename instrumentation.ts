/** Runs once when the server starts: wrong settings or an old schema stop it with a sentence. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { startPortal } = await import('@/lib/server/start-portal')
  await startPortal()
}
