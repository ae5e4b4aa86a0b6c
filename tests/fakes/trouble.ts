import { json, type FakeReply } from './http-server'

/**
 * What goes wrong with an answer. `status` refuses before anything is done; with all others the work is done and only
 * the answer suffers, which is what idempotency keys are for.
 */
export type Trouble =
  | { readonly kind: 'dropped' | 'half' | 'unreadable' }
  | { readonly kind: 'slow'; readonly milliseconds: number }
  | { readonly kind: 'status'; readonly status: number; readonly body?: unknown }

export type TroubleQueue = {
  /** The next answers, as many as `count`, suffer this. */
  readonly plan: (trouble: Trouble, count?: number) => void
  readonly clear: () => void
  readonly waiting: () => number
  readonly around: (act: () => FakeReply) => FakeReply
}

export function createTroubleQueue(): TroubleQueue {
  const planned: Trouble[] = []
  return {
    plan: (trouble, count = 1) => planned.push(...Array.from({ length: count }, () => trouble)),
    clear: () => void planned.splice(0),
    waiting: () => planned.length,
    around: (act) => {
      const trouble = planned.shift()
      return trouble === undefined ? act() : spoil(trouble, act)
    },
  }
}

function spoil(trouble: Trouble, act: () => FakeReply): FakeReply {
  switch (trouble.kind) {
    case 'status':
      return json(trouble.status, 'body' in trouble ? trouble.body : plannedError)
    case 'dropped':
      return { ...act(), cut: 'before' }
    case 'half':
      return { ...act(), cut: 'half_way' }
    case 'unreadable':
      return { ...act(), body: '<html>Service busy</html>' }
    case 'slow':
      return { ...act(), delayMilliseconds: trouble.milliseconds }
  }
}

const plannedError = { error: { type: 'api_error', message: 'This answer was planned to fail.' } }
