import { spawnSync } from 'node:child_process'

/** Whether the Python of this machine has numpy and scipy, against which some numbers are checked. */
export const hasNumpy = spawnSync('python3', ['-c', 'import numpy, scipy']).status === 0
