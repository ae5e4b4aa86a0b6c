import { lengthInput } from './inductance-inputs'

const coordinate = { unit: 'm', atLeast: -1e3, atMost: 1e3 } as const

/** What a drawn loop takes. */
export const polygonLoopInputs = {
  corners: {
    kind: 'table',
    label: 'Corners',
    symbol: 'P',
    help: 'One after the other along the middle of the conductor; the last is joined to the first',
    isRequired: true,
    columns: {
      x: { label: 'x', symbol: 'x', ...coordinate },
      y: { label: 'y', symbol: 'y', ...coordinate },
    },
    leastRows: 3,
    mostRows: 400,
  },
  conductor: {
    kind: 'choice',
    label: 'Conductor',
    symbol: 'type',
    help: 'What the loop is made of, and how the current flows in it',
    isRequired: true,
    options: {
      wireSurface: 'Round wire, current on its surface',
      wireUniform: 'Round wire, current evenly spread',
      trace: 'Trace or bar, current evenly spread',
    },
  },
  wireRadius: lengthInput('Radius of the wire', 'r', 'For a wire', false),
  traceWidth: lengthInput('Width of the trace', 'w', 'For a trace or bar, in the plane of the loop', false),
  thickness: lengthInput('Thickness of the trace', 't', 'For a trace or bar; left empty, 35 µm', false),
  height: lengthInput(
    'Height over a plane',
    'h',
    'Of the middle of the conductor; left empty, there is no plane',
    false,
  ),
} as const
