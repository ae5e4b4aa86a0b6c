import { defineMethod } from '../method/method'
import { main, step } from '../method/result-value'
import { ok } from '../result'
import { currentModelSpread, derivedHere, lengthInput, loopCautions, rosaSource } from './inductance-inputs'
import { longTubeSelf, solidRoundSelf, tubeSelf } from './round-conductor'
import { viaFluxToSurface, viaMicrostripFit, viaPopular } from './via-partial'

/** Partial self-inductance of a via, and what popular formulas give for it. */
export const viaPartialInductance = defineMethod({
  id: 'via-partial-inductance',
  version: 1,
  title: 'Partial inductance of a via',
  purpose: 'Gives the partial self-inductance of one via, beside what the usual formulas say.',
  inputs: {
    length: lengthInput('Length', 'h', 'Between the layers that it joins', true),
    diameter: lengthInput('Diameter', 'd', 'Of the barrel', true),
  },
  formulas: [
    'L = (1/π) ∫₀^π M(h, d sin(φ/2)) dφ, current on the barrel; M: two filaments of length h',
    'Long: L = (µ₀ h/2π)(ln(4h/d) − 1)',
    'Popular: (µ₀ h/2π)(ln(4h/d) + 1), that is 5.08 h (ln(4h/d) + 1) nH with h in inches',
  ],
  notes: [
    'The popular form has + 1 where every derivation has − 1: it is high by µ₀ h/π, 10 nH an inch, nearly twofold for 1.6 mm and 0.3 mm. Its author says that the constant depends on the return path that is assumed.',
    'Below h = 2d the long form is useless: it gives a fifth of the exact value for 0.2 mm and 0.25 mm.',
    'No return path is included: with one, use the form for a via with its returns.',
  ],
  cautions: loopCautions,
  sources: [
    rosaSource,
    {
      citation:
        'M. E. Goldfarb, R. A. Pucel, Modeling Via Hole Grounds in Microstrip, IEEE Microwave and Guided Wave Letters 1, 1991, no. 6 (formula from memory)',
      standing: 'published',
    },
    {
      citation: 'The form with + 1, as boards are often estimated with it',
      standing: 'common practice, no source',
    },
    derivedHere,
  ],
  example: { length: '1.6 mm', diameter: '0.3 mm' },
  compute: ({ length, diameter }) => {
    const radius = diameter / 2
    const [tube, solid] = [tubeSelf(length, radius), solidRoundSelf(length, radius)]
    const isSlender = length >= 2 * diameter
    return ok({
      results: [
        main('tube', 'Partial inductance, current on the barrel', 'L', 'H', tube),
        step('solid', 'Filled via, current evenly spread', 'L', 'H', solid),
        currentModelSpread(tube, solid),
        step('long', 'Form for a long via', 'L', 'H', longTubeSelf(length, radius)),
        step(
          'fluxToSurface',
          'Flux of the axis outside the barrel',
          'L',
          'H',
          viaFluxToSurface(length, radius),
        ),
        step(
          'microstripFit',
          'Fit for a ground via in microstrip',
          'L',
          'H',
          viaMicrostripFit(length, radius),
        ),
        step('popular', 'Popular form with + 1, too high', 'L', 'H', viaPopular(length, diameter)),
      ],
      choices: [],
      validity: [
        {
          passed: isSlender,
          sentence: isSlender
            ? 'The via is at least two diameters long.'
            : 'The via is shorter than two diameters: the planes and pads around it decide more than its barrel, and the form for a long via is useless.',
        },
      ],
      figures: [],
    })
  },
})
