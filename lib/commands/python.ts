import { execFileSync } from 'node:child_process'

/** The Python that has numpy and scipy: that of the path or the system's; null where neither has them. */
export function pythonWithScipy(): string | null {
  const found = ['python3', '/usr/bin/python3'].find((python) => {
    try {
      execFileSync(python, ['-c', 'import numpy, scipy'], { stdio: 'ignore' })
      return true
    } catch {
      return false
    }
  })
  return found ?? null
}
