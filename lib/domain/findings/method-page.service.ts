import 'server-only'

import { authorize, notFound } from '@/lib/authz/authorize'
import { practice } from '@/lib/authz/resource'
import { findMethod } from '@/lib/core/method/registry'
import { err, ok } from '@/lib/core/result'

import { noInput } from '../form-fields'
import { operation } from '../operation'
import { methodHeadings } from './method-headings'
import { methodDefinition } from './run-definition'
import { methodIdSchema } from './runs.schema'

/** Every method of the practice by its group: what it is for, open to everybody who signs in. */
export const listMethodPages = operation('methods.list', noInput, async (_deps, actor) => {
  const allowed = authorize(actor, 'method.read', practice)
  if (!allowed.ok) return allowed
  return ok(methodHeadings())
})

/** All that is to be known of a method, with its worked example computed now. */
export const getMethodPage = operation('methods.get', methodIdSchema, async (_deps, actor, input) => {
  const allowed = authorize(actor, 'method.read', practice)
  if (!allowed.ok) return allowed
  const method = findMethod(input.methodId)
  const definition = methodDefinition(input.methodId)
  if (!method || !definition) return err(notFound)
  const example = method.run(method.example)
  if (!example.ok) throw new Error(`The worked example of ${method.id} is refused: ${example.error.message}`)
  return ok({ definition, example: example.value.outcome, given: method.example })
})
