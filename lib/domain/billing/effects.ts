/** What an event can do to its object; each of them happens once for an object, whichever event brings it. */
export const effects = {
  completed: 'completed',
  credit: 'credit',
  failed: 'failed',
  expired: 'expired',
} as const
