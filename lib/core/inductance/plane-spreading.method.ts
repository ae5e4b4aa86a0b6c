import { defineMethod, noSolution } from '../method/method'
import { main, step } from '../method/result-value'
import { vacuumPermeability } from '../physics/constants'
import { err, ok } from '../result'
import { derivedHere, lengthInput, loopCautions } from './inductance-inputs'
import { planeSpreading, viaPair } from './via'

/** Spreading inductance of a pair of planes around a via. */
export const planeSpreadingInductance = defineMethod({
  id: 'plane-spreading-inductance',
  version: 1,
  title: 'Spreading inductance of a plane pair',
  purpose:
    'Gives the inductance of a pair of planes between a via and a ring of parts around it, or a second via.',
  inputs: {
    height: lengthInput('Distance of the planes', 'h', 'Thickness of the dielectric', true),
    diameter: lengthInput('Diameter of the via', 'd', 'Of the barrel', true),
    outerRadius: lengthInput(
      'Distance',
      'R',
      'From the middle of the via to the ring or to the second via',
      true,
    ),
  },
  formulas: [
    'To a ring: L = (µ₀ h/2π) ln(2R/d)',
    'To a second via of the same diameter: L = (µ₀ h/π) acosh(R/d)',
  ],
  notes: [
    'Half of it lies within the geometric mean of R and d/2: parts far from the via cost little more than near ones, but the first millimetre costs most.',
    'Planes of limited size have more: the current cannot spread on all sides.',
    'The vias of the parts come on top.',
  ],
  cautions: loopCautions,
  sources: [derivedHere],
  example: { height: '0.1 mm', diameter: '0.3 mm', outerRadius: '10 mm' },
  compute: ({ height, diameter, outerRadius }) => {
    if (outerRadius <= diameter) {
      return err(noSolution('The distance must be more than the diameter of the via.', 'outerRadius'))
    }
    const isFlat = outerRadius >= 3 * height
    return ok({
      results: [
        main('ring', 'To a ring of parts', 'L', 'H', planeSpreading(height, outerRadius, diameter / 2)),
        main('via', 'To a second via', 'L', 'H', viaPair(height, outerRadius, diameter)),
        step('perSquare', 'A square of the planes', 'µ₀ h', 'H', vacuumPermeability * height),
      ],
      choices: [],
      validity: [
        {
          passed: isFlat,
          sentence: isFlat
            ? 'The distance is large against that of the planes.'
            : 'The distance is small against that of the planes: the field is still even between perfect planes, but antipads and pads matter as much.',
        },
      ],
      figures: [],
    })
  },
})
