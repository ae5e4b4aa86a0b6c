import { wavelengthOf } from '../emission/radiated-field'
import { difference, norm, type Point3 } from '../linear/point'
import { defineMethod, noSolution, type ValidityCheck } from '../method/method'
import { main, step } from '../method/result-value'
import { vacuumPermeability } from '../physics/constants'
import { err, ok } from '../result'
import { polygonField } from './biot-savart'

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
    frequency: {
      label: 'Frequency',
      symbol: 'f',
      unit: 'Hz',
      help: 'Of the current, to check that the loop is short and the point near; left empty, not checked',
      isRequired: false,
      atLeast: 1e-3,
      atMost: 1e15,
    },
  },
  formulas: [
    'H = Σ I/(4πd) (cos α₁ − cos α₂) over the sides',
    'evaluated as (I/4π)(u × v)(|u| + |v|)/(|u||v|(|u||v| + u·v)),   u and v to the ends of a side',
  ],
  notes: [
    'Holds for a thin wire, seen from further than its thickness.',
    'The currents that a plane or a housing carries in answer are not included: near a plane the field is smaller.',
  ],
  cautions: [],
  sources: [
    { citation: 'Law of Biot and Savart', standing: 'published' },
    { citation: 'Closed form of a straight side', standing: 'derived here, checked from outside' },
  ],
  example: {
    corners: '0, 0\n20 mm, 0\n20 mm, 10 mm\n0, 10 mm',
    current: '0.5 A',
    x: '4 mm',
    y: '13 mm',
    z: '6 mm',
  },
  compute: ({ corners, current, x, y, z, frequency }) => {
    const points = corners.map((corner): Point3 => [corner.x, corner.y, corner.z])
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
      validity: frequency === undefined ? [] : quasiStaticChecks(points, [x, y, z], wavelengthOf(frequency)),
      figures: [],
    })
  },
})

/** The law of Biot and Savart has no delay: the loop must be short and the point near, against the wavelength. */
function quasiStaticChecks(
  corners: readonly Point3[],
  point: Point3,
  wavelength: number,
): readonly ValidityCheck[] {
  const perimeter = corners.reduce(
    (sum, corner, index) => sum + norm(difference(corners[(index + 1) % corners.length] ?? corner, corner)),
    0,
  )
  const furthest = Math.max(...corners.map((corner) => norm(difference(corner, point))))
  const isShort = perimeter < wavelength / 4
  const isNear = furthest < wavelength / (2 * Math.PI)
  return [
    {
      passed: isShort,
      sentence: isShort
        ? 'The perimeter is below a quarter of the wavelength: the current is nearly the same all around.'
        : 'The perimeter is above a quarter of the wavelength: the current is not the same all around.',
    },
    {
      passed: isNear,
      sentence: isNear
        ? 'The whole loop is nearer than λ/2π to the point, as a field without delay needs.'
        : 'Part of the loop is further than λ/2π from the point: use the field of a small loop, which has the far terms.',
    },
  ]
}
