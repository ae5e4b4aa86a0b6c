import type { InputDefinitions } from '@/lib/core/method/input-definition'
import type { Source } from '@/lib/core/method/method'
import { findMethod } from '@/lib/core/method/registry'
import { ringMeasurementMethod } from '@/lib/core/ring/ring-measurement-method'

/** What is said of a method beside its numbers; plain data, so that a page can be given it. */
export type MethodDefinition = {
  readonly id: string
  readonly version: number
  readonly title: string
  readonly purpose: string
  readonly inputs: InputDefinitions
  readonly formulas: readonly string[]
  readonly notes: readonly string[]
  readonly cautions: readonly string[]
  readonly sources: readonly Source[]
}

/** The definition that a stored run was made by, whether a method on values or the measurement of a capture. */
export function definitionOf(methodId: string): MethodDefinition {
  if (methodId === ringMeasurementMethod.id) return ringMeasurementMethod
  const definition = methodDefinition(methodId)
  if (!definition) throw new Error(`A run of the unknown method ${methodId}`)
  return definition
}

export function methodDefinition(methodId: string): MethodDefinition | undefined {
  const method = findMethod(methodId)
  if (!method) return undefined
  const { run: _run, ...definition } = method
  return definition
}
