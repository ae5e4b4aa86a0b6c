import { handle, privateJson, problem } from '@/lib/server/http'
import { timers } from '@/lib/server/operations'

/** The person's running timer, or null. */
export const GET = handle(async ({ deps, actor }) => {
  const timer = await timers.myTimer.execute(deps, actor, {})
  return timer.ok ? privateJson(timer.value) : problem(timer.error, deps.request.id)
})

/** Stops it; what it measured becomes a draft. */
export const DELETE = handle(async ({ deps, actor }) => {
  const stopped = await timers.stopTimer.execute(deps, actor, {})
  return stopped.ok ? privateJson(stopped.value) : problem(stopped.error, deps.request.id)
})
