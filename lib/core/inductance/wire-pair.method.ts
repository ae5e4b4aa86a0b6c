import { defineMethod, noSolution } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok } from '../result'
import { currentModelSpread, derivedHere, lengthInput, loopCautions } from './inductance-inputs'
import { roundPair, roundPairUniform } from './line'

/** Inductance of two parallel round wires. */
export const wirePairInductance = defineMethod({
  id: 'wire-pair-inductance',
  version: 1,
  title: 'Inductance of a pair of wires',
  purpose: 'Gives the inductance per length of two parallel round wires that carry a current forth and back.',
  inputs: {
    spacing: lengthInput('Spacing', 's', 'Between the middles of the wires', true),
    radius: lengthInput('Radius of each wire', 'r', 'Half of the diameter of the metal', true),
  },
  formulas: [
    'Current on the surface (skin and proximity effect): L′ = (µ₀/π) acosh(s/2r)',
    'Current evenly spread: L′ = (µ₀/π) (ln(s/r) + ¼)',
  ],
  notes: ['A wire over a plane has half the inductance of the pair with twice its height as spacing.'],
  cautions: loopCautions,
  sources: [derivedHere],
  example: { spacing: '2 mm', radius: '0.3 mm' },
  compute: ({ spacing, radius }) => {
    if (spacing <= 2 * radius)
      return err(noSolution('The wires must not touch: s is more than 2r.', 'spacing'))
    const surface = roundPair(spacing, radius)
    const uniform = roundPairUniform(spacing, radius)
    return ok({
      results: [
        main('surface', 'Inductance per length, current on the surface', 'L′', 'H/m', surface),
        main('uniform', 'Inductance per length, current evenly spread', 'L′', 'H/m', uniform),
        step('overPlane', 'One wire over a plane at s/2', 'L′/2', 'H/m', surface / 2),
        { ...currentModelSpread(surface, uniform), unit: 'H/m' },
      ],
      choices: [],
      validity: [],
      figures: [],
    })
  },
})
