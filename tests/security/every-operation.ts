import { readdirSync } from 'node:fs'
import { fileURLToPath } from 'node:url'

import type { OpenOperation, Operation } from '@/lib/domain/operation'

export type AnyOperation = Operation | OpenOperation

const domains = fileURLToPath(new URL('../../lib/domain/', import.meta.url))

const isOperation = (value: unknown): value is AnyOperation =>
  typeof value === 'object' &&
  value !== null &&
  'kind' in value &&
  (value.kind === 'operation' || value.kind === 'open-operation')

/** Every operation that a service of the domain exports: all that a page or a route can ask for. */
export async function everyOperation(): Promise<readonly AnyOperation[]> {
  const files = readdirSync(domains, { recursive: true })
    .map(String)
    .filter((file) => file.endsWith('.service.ts'))
  const modules = await Promise.all(
    files.map((file): Promise<Record<string, unknown>> => import(/* @vite-ignore */ `${domains}${file}`)),
  )
  return modules.flatMap((module) => Object.values(module).filter(isOperation))
}
