import { findObject, type Store } from './account'

/** Replaces ids by the objects themselves along a path such as `latest_charge.balance_transaction`. */
export function expand(store: Store, object: unknown, paths: readonly string[]): unknown {
  return paths.reduce((whole, path) => expandPath(store, whole, path.split('.')), object)
}

function expandPath(store: Store, value: unknown, path: readonly string[]): unknown {
  const [name, ...rest] = path
  if (name === undefined || typeof value !== 'object' || value === null) return value
  return Object.fromEntries(
    Object.entries(value).map(([key, inner]: [string, unknown]) => {
      if (key !== name) return [key, inner]
      const found = typeof inner === 'string' ? (findObject(store, inner) ?? inner) : inner
      return [key, expandPath(store, found, rest)]
    }),
  )
}
