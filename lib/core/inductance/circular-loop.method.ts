import { defineMethod, noSolution } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok } from '../result'
import { conductingRing, thickestRing } from './conducting-ring'
import { currentModelSpread, derivedHere, lengthInput, loopCautions } from './inductance-inputs'
import { circularLoop, circularLoopSecondOrder } from './loop'

/** Inductance of a circle of round wire. */
export const circularLoopInductance = defineMethod({
  id: 'circular-loop-inductance',
  version: 2,
  title: 'Inductance of a circular loop',
  purpose: 'Gives the inductance of a circle of round wire, far from other conductors.',
  inputs: {
    radius: lengthInput('Radius of the loop', 'a', 'To the middle of the wire', true),
    wireRadius: lengthInput('Radius of the wire', 'r', 'Half of its diameter', true),
  },
  formulas: [
    'Current on the surface (skin effect): L = µ₀ a (ln(8a/r) − 2)',
    'Current evenly spread: L = µ₀ a (ln(8a/r) − 7/4)',
    'Evenly spread, to the second order: L = µ₀ a {ln(8a/r) − 7/4 + (r²/8a²)[ln(8a/r) + 1/3]}',
    'Perfect conductor, exact: the flux through every circle on the wire’s surface is the same, solved in toroidal coordinates',
  ],
  notes: [
    'The flux through the circle at the inner edge of the wire looks exact but is 3 to 11 % low: it is a mutual inductance, not the self-inductance.',
    'Name the model of the current with the number: the two differ by 50 nH a metre of wire.',
  ],
  cautions: loopCautions,
  sources: [
    {
      citation: 'J. C. Maxwell, A Dynamical Theory of the Electromagnetic Field, 1865, art. 112–113',
      standing: 'published',
    },
    {
      citation:
        'E. B. Rosa, F. W. Grover, Formulas and Tables for the Calculation of Mutual and Self-Inductance, Bulletin of the Bureau of Standards 8, 1912 (from memory)',
      standing: 'published',
    },
    derivedHere,
  ],
  example: { radius: '10 mm', wireRadius: '0.5 mm' },
  compute: ({ radius, wireRadius }) => {
    if (wireRadius / radius > thickestRing)
      return err(noSolution('The wire must be thinner than the loop is wide.', 'wireRadius'))
    const surface = circularLoop(radius, wireRadius, 'surface')
    const uniform = circularLoop(radius, wireRadius, 'uniform')
    if (!(surface > 0)) return err(noSolution('The wire is too thick for this formula.', 'wireRadius'))
    const isThin = wireRadius <= 0.1 * radius
    return ok({
      results: [
        main('surface', 'Inductance, current on the surface', 'L', 'H', surface),
        main('uniform', 'Inductance, current evenly spread', 'L', 'H', uniform),
        main(
          'exact',
          'Inductance of a perfect conductor, exact',
          'L',
          'H',
          conductingRing(radius, wireRadius),
        ),
        step(
          'uniformSecondOrder',
          'Current evenly spread, to the second order',
          'L',
          'H',
          circularLoopSecondOrder(radius, wireRadius),
        ),
        currentModelSpread(surface, uniform),
        step('thinness', 'Thickness of the wire', 'r/a', '', wireRadius / radius),
      ],
      choices: [],
      validity: [
        {
          passed: isThin,
          sentence: isThin
            ? 'The wire is thin: r/a is at most 0.1, and the surface form at most 1.1 % high.'
            : 'r/a is above 0.1: the surface form is more than 1 % high, 4 % at 0.2. Take the exact value.',
        },
      ],
      figures: [],
    })
  },
})
