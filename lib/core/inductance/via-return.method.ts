import { defineMethod, noSolution } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok } from '../result'
import { derivedHere, lengthInput, loopCautions } from './inductance-inputs'
import { planeSpreading, viaPair, viaWithReturns } from './via'

/** Inductance of a via with its return vias between two planes. */
export const viaReturnInductance = defineMethod({
  id: 'via-return-inductance',
  version: 1,
  title: 'Inductance of a via with its returns',
  purpose:
    'Gives the inductance of a via between two planes whose current comes back through one or more vias around it.',
  inputs: {
    height: lengthInput('Distance of the planes', 'h', 'Length of the via between them', true),
    distance: lengthInput('Distance of the returns', 's', 'From middle to middle', true),
    diameter: lengthInput('Diameter of the vias', 'd', 'Of the barrel', true),
    count: {
      label: 'Number of returns',
      symbol: 'n',
      unit: '',
      help: 'Evenly on a circle around the via; left empty, one',
      isRequired: false,
      atLeast: 1,
      atMost: 1000,
    },
  },
  formulas: [
    'One return: L = (µ₀ h/π) acosh(s/d)',
    'n returns that share equally: L = (µ₀ h/2π) [(1 + 1/n) ln(2s/d) − ln(n)/n]',
    'Plane pair from the via to a ring at s: L = (µ₀ h/2π) ln(2s/d)',
  ],
  notes: [
    'A via alone has no inductance that could be measured; it is that of a loop, and so depends on where the return is.',
    '“5.08 h (ln(4h/d) + 1)” is larger than any partial inductance of a via, by 10 nH an inch; the derivation gives −1 in place of +1.',
    'Versions with “+ 0.5 ln 2” for two and “+ 0.25 ln 2” for four returns have the wrong sign: it is −0.5 ln 2 for both.',
  ],
  cautions: loopCautions,
  sources: [derivedHere],
  example: { height: '1 mm', distance: '1 mm', diameter: '0.3 mm', count: '2' },
  compute: ({ height, distance, diameter, count = 1 }) => {
    if (distance <= diameter) return err(noSolution('The vias must not touch: s is more than d.', 'distance'))
    if (!Number.isInteger(count)) return err(noSolution('The number of returns is a whole number.', 'count'))
    const inductance =
      count === 1 ? viaPair(height, distance, diameter) : viaWithReturns(height, distance, diameter, count)
    if (!(inductance > 0)) {
      return err(noSolution('So many vias do not fit on this circle: they would touch.', 'count', 'distance'))
    }
    const isThin = count === 1 || distance >= 2 * diameter
    return ok({
      results: [
        main('inductance', 'Inductance', 'L', 'H', inductance),
        step('oneReturn', 'With one return', 'L₁', 'H', viaPair(height, distance, diameter)),
        step(
          'spreading',
          'Plane pair to a ring at s',
          'L',
          'H',
          planeSpreading(height, distance, diameter / 2),
        ),
      ],
      choices: [],
      validity: [
        {
          passed: isThin,
          sentence: isThin
            ? 'The vias are thin enough against their distance for the formula used.'
            : 'The returns are nearer than two diameters: the formula for several returns takes vias as thin.',
        },
      ],
      figures: [],
    })
  },
})
