import { defineMethod, noSolution } from '../method/method'
import { main, step } from '../method/result-value'
import { vacuumPermeability } from '../physics/constants'
import { err, ok } from '../result'
import { polygonField } from './biot-savart'
import type { Vector } from './point'

const coordinate = { unit: 'm', atLeast: -1e6, atMost: 1e6 } as const
const place = { ...coordinate, isRequired: true } as const

/** Near field of a loop of any shape. */
export const polygonNearField = defineMethod({
  id: 'polygon-near-field',
  version: 1,
  title: 'Near field of a drawn loop',
  purpose:
    'Gives the magnetic field at a point near a loop of any shape, such as where a probe or a sensitive trace lies.',
  inputs: {
    corners: {
      kind: 'table',
      label: 'Corners',
      symbol: 'P_i',
      help: 'In the order in which the current passes them; the last joins the first',
      isRequired: true,
      columns: {
        x: { label: 'x', symbol: 'x', ...coordinate },
        y: { label: 'y', symbol: 'y', ...coordinate },
        z: { label: 'z', symbol: 'z', ...coordinate, fallback: 0 },
      },
      leastRows: 3,
      mostRows: 10_000,
    },
    current: {
      label: 'Current',
      symbol: 'I',
      unit: 'A',
      help: 'Peak or rms: the field is the same of the two',
      isRequired: true,
      above: 0,
      atMost: 1e9,
    },
    x: { label: 'Point, x', symbol: 'x', help: 'Where the field is wanted', ...place },
    y: { label: 'Point, y', symbol: 'y', help: 'Where the field is wanted', ...place },
    z: { label: 'Point, z', symbol: 'z', help: 'Above the plane of the board', ...place },
  },
  formulas: [
    'H = Σ I/(4πd) (cos α₁ − cos α₂) over the sides',
    'evaluated as (I/4π)(u × v)(|u| + |v|)/(|u||v|(|u||v| + u·v)),   u and v to the ends of a side',
  ],
  notes: [
    'The currents that a plane or a housing carries in answer are not included: near a plane the field is smaller.',
  ],
  cautions: [],
  sources: [
    { citation: 'Law of Biot and Savart', standing: 'published' },
    { citation: 'Closed form of a straight side', standing: 'derived here, checked from outside' },
  ],
  example: { corners: '0, 0\n20m, 0\n20m, 10m\n0, 10m', current: '0.5 A', x: '4 mm', y: '13 mm', z: '6 mm' },
  compute: ({ corners, current, x, y, z }) => {
    const points = corners.map((corner): Vector => [corner.x, corner.y, corner.z])
    const field = polygonField(points, current, [x, y, z])
    if (!field.ok) {
      const about = field.error.code === 'on_the_wire' ? ['x', 'y', 'z'] : ['corners']
      return err(noSolution(field.error.message, ...about))
    }
    const size = Math.hypot(...field.value)
    return ok({
      results: [
        main('magnetic', 'Magnetic field', 'H', 'A/m', size),
        main('fluxDensity', 'Magnetic flux density', 'B', 'T', vacuumPermeability * size),
        step('hx', 'Along x', 'H_x', 'A/m', field.value[0]),
        step('hy', 'Along y', 'H_y', 'A/m', field.value[1]),
        step('hz', 'Along z', 'H_z', 'A/m', field.value[2]),
      ],
      choices: [],
      validity: [
        {
          passed: true,
          sentence: 'Holds for thin wires, seen from further than their thickness, and nearer than λ/2π.',
        },
      ],
      figures: [],
    })
  },
})
