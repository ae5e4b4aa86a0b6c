import 'server-only'

/** State changes come from our own pages only: no origin, a null one or another one is refused. */
export function isSameOrigin(origin: string | null, publicUrl: string): boolean {
  return origin !== null && origin === new URL(publicUrl).origin
}
