import { defineMethod, noSolution } from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok } from '../result'
import { currentModelSpread, derivedHere, lengthInput, loopCautions } from './inductance-inputs'
import { equivalentRadius, rectangularLoop } from './loop'

/** Inductance of a rectangle of round wire or of a flat trace. */
export const rectangularLoopInductance = defineMethod({
  id: 'rectangular-loop-inductance',
  version: 1,
  title: 'Inductance of a rectangular loop',
  purpose:
    'Gives the inductance of a rectangle of round wire or flat trace without a plane, such as a hot loop.',
  inputs: {
    width: lengthInput('Width', 'W', 'Between the middles of the conductors', true),
    height: lengthInput('Height', 'H', 'Between the middles of the conductors', true),
    wireRadius: lengthInput('Radius of the wire', 'r', 'For round wire; leave empty for a trace', false),
    traceWidth: lengthInput('Width of the trace', 'w', 'For a flat trace; leave empty for a wire', false),
    thickness: lengthInput('Thickness of the trace', 't', 'Of the copper; left empty, 35 µm', false),
  },
  formulas: [
    'L = µ₀/π · [(W + H) ln(2WH/r) − W ln(W + D) − H ln(H + D) − (2 − Y)(W + H) + 2D],   D = √(W² + H²)',
    'Y = 0 for current on the surface (skin effect), ¼ for current evenly spread',
    'Flat trace: r = 0.2235 (w + t), Y = 0',
  ],
  notes: [
    'Variants of this formula in handbooks differ by the term of the wire’s end, about 0.4 %; the corners leave as much open. Claim no better than 1 %.',
    'A plane below lowers the inductance by much: use the form for a trace over a plane.',
  ],
  cautions: loopCautions,
  sources: [
    { citation: 'F. W. Grover, Inductance Calculations, 1946 (from memory)', standing: 'published' },
    derivedHere,
  ],
  example: { width: '30 mm', height: '10 mm', traceWidth: '1 mm', thickness: '35 µm' },
  compute: ({ width, height, wireRadius, traceWidth, thickness = 35e-6 }) => {
    if ((wireRadius === undefined) === (traceWidth === undefined)) {
      const message = 'Enter either the radius of a wire or the width of a trace.'
      return err(noSolution(message, 'wireRadius', 'traceWidth'))
    }
    const radius = wireRadius ?? equivalentRadius(traceWidth ?? 0, thickness)
    const across = 2 * (wireRadius ?? (traceWidth ?? 0) / 2)
    const side = Math.min(width, height)
    if (across >= side) {
      return err(
        noSolution('The conductor must be narrower than the shorter side.', 'wireRadius', 'traceWidth'),
      )
    }
    const surface = rectangularLoop(width, height, radius, 'surface')
    const uniform = rectangularLoop(width, height, radius, 'uniform')
    if (!(surface > 0)) return err(noSolution('The conductor is too thick for this formula.'))
    const isNarrow = across <= 0.1 * side
    return ok({
      results: [
        main('inductance', 'Inductance', 'L', 'H', surface),
        ...(wireRadius === undefined
          ? []
          : [
              main('uniform', 'Inductance, current evenly spread', 'L', 'H', uniform),
              currentModelSpread(surface, uniform),
            ]),
        step('equivalentRadius', 'Radius in the formula', 'r', 'm', radius),
        step('diagonal', 'Diagonal', 'D', 'm', Math.hypot(width, height)),
      ],
      choices: [],
      validity: [
        {
          passed: isNarrow,
          sentence: isNarrow
            ? 'The conductor is at most a tenth of the shorter side: good to about 1 %.'
            : 'The conductor is wider than a tenth of the shorter side: the result is low, by 4 % at a quarter.',
        },
      ],
      figures: [],
    })
  },
})
