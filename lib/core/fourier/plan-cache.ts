/** Keeps what was made for the lengths used last, so that a second transform of one length needs no tables made. */
export function lastUsed<Value>(most: number, make: (length: number) => Value): (length: number) => Value {
  const kept = new Map<number, Value>()
  return (length) => {
    const value = kept.get(length) ?? make(length)
    kept.delete(length)
    kept.set(length, value)
    const [oldest] = kept.keys()
    if (kept.size > most && oldest !== undefined) kept.delete(oldest)
    return value
  }
}
