import type { InputDefinitions } from '../method/input-definition'

/** The bounds are far beyond any board; within them every step of the computation is well conditioned. */
const bounds = {
  inductance: { atLeast: 1e-12, atMost: 1e-3 },
  capacitance: { atLeast: 1e-14, atMost: 1e-6 },
  resistance: { atLeast: 1e-3, atMost: 1e6 },
  voltage: { atLeast: 1e-6, atMost: 1e5 },
  frequency: { atLeast: 1e-3, atMost: 1e10 },
} as const

export const rcSnubberInputs = {
  lPar: {
    label: 'Parasitic inductance',
    symbol: 'L_par',
    unit: 'H',
    help: 'Of the hot loop',
    isRequired: true,
    usualTolerance: '10 %',
    ...bounds.inductance,
  },
  cPar: {
    label: 'Parasitic capacitance',
    symbol: 'C_par',
    unit: 'F',
    help: 'Of the node',
    isRequired: true,
    usualTolerance: '10 %',
    ...bounds.capacitance,
  },
  rSeries: {
    label: 'Series resistance',
    symbol: 'R',
    unit: 'Ω',
    help: 'Of the loop at the ring frequency; left empty, none: the cautious choice',
    isRequired: false,
    atLeast: 0,
    atMost: bounds.resistance.atMost,
  },
  vStep: {
    label: 'Voltage step',
    symbol: 'V',
    unit: 'V',
    help: 'From low to high',
    isRequired: true,
    ...bounds.voltage,
  },
  edge: {
    label: 'Edge of the source',
    symbol: 't_r',
    unit: 's',
    help: '0 to 100 %, without the ring; left empty, an ideal step: the cautious choice',
    isRequired: false,
    atLeast: 0,
    atMost: 1e-3,
  },
  fSw: {
    label: 'Switching frequency',
    symbol: 'f',
    unit: 'Hz',
    help: 'Two edges a period',
    isRequired: true,
    ...bounds.frequency,
  },
  cSnub: {
    label: 'Snubber capacitance',
    symbol: 'C_s',
    unit: 'F',
    help: 'Left empty, the E12 value nearest to 3 C_par is taken',
    isRequired: false,
    usualTolerance: '5 %',
    ...bounds.capacitance,
  },
  rSnub: {
    label: 'Snubber resistance',
    symbol: 'R_s',
    unit: 'Ω',
    help: 'Left empty, the E24 value with the least overshoot is taken',
    isRequired: false,
    usualTolerance: '1 %',
    ...bounds.resistance,
  },
} as const satisfies InputDefinitions
