import 'server-only'

/**
 * The fields of a submitted form as a plain object: "oscillators.0.name" becomes a nested list, a repeated field a
 * list, and the framework's own `$ACTION…` fields are left out. What is in the form reaches the schema, so an extra
 * field is refused there.
 */
export function formInput(form: FormData): unknown {
  const root: Node = {}
  for (const name of new Set(form.keys())) {
    if (name.startsWith('$ACTION')) continue
    const values = form.getAll(name)
    place(root, name.split('.'), values.length > 1 || name.endsWith('[]') ? values : values[0])
  }
  return asLists(root)
}

type Node = { [key: string]: unknown }

const forbiddenKeys = new Set(['__proto__', 'constructor', 'prototype'])

function place(root: Node, path: readonly string[], value: unknown): void {
  let node = root
  for (const [index, key] of path.entries()) {
    if (forbiddenKeys.has(key)) return
    if (index === path.length - 1) {
      node[key.replace(/\[\]$/, '')] = value
      return
    }
    const child = node[key]
    const next: Node = isNode(child) ? child : {}
    node[key] = next
    node = next
  }
}

function isNode(value: unknown): value is Node {
  return typeof value === 'object' && value !== null && !Array.isArray(value) && !(value instanceof File)
}

/** Objects whose keys are 0, 1, 2 … are lists. */
function asLists(value: unknown): unknown {
  if (!isNode(value)) return value
  const entries = Object.entries(value).map(([key, child]) => [key, asLists(child)] as const)
  const isList = entries.length > 0 && entries.every(([key]) => /^\d{1,4}$/.test(key))
  if (!isList) return Object.fromEntries(entries)
  return entries.sort(([a], [b]) => Number(a) - Number(b)).map(([, child]) => child)
}
