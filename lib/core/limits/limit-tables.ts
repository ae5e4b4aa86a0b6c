import { cispr25 } from './cispr-25'
import { cispr32 } from './cispr-32'
import { fcc15107 } from './fcc-15-107'
import { fcc15109 } from './fcc-15-109'
import { fcc15209 } from './fcc-15-209'
import type { LimitTable } from './limit-table'
import { milStd461g } from './mil-std-461g'

/** Every limit line that the practice computes margins against. */
export const limitTables: readonly LimitTable[] = [
  ...cispr32,
  ...fcc15109,
  ...fcc15107,
  ...fcc15209,
  ...cispr25,
  ...milStd461g,
]

export const findLimitTable = (id: string): LimitTable | undefined =>
  limitTables.find((table) => table.id === id)

/** How a limit line is called in lists and on figures. */
export function limitTitle({ standard, deviceClass, port, distance, detector }: LimitTable): string {
  const where = { mains: 'mains port', supply: 'supply lines', enclosure: `${distance ?? 0} m` }[port]
  const kind =
    deviceClass === '-' ? '' : /^[A-Z0-9]$/u.test(deviceClass) ? ` class ${deviceClass}` : ` ${deviceClass}`
  return `${standard}${kind}, ${where}, ${detector}`
}
