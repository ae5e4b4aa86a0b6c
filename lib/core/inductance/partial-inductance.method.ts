import {
  defineMethod,
  noSolution,
  type MethodError,
  type MethodOutcome,
  type ValidityCheck,
} from '../method/method'
import { main, step } from '../method/result-value'
import { err, ok, type Result } from '../result'
import { barSelf, barSelfApproximate, type Bar } from './bar'
import { currentModelSpread, derivedHere, lengthInput, loopCautions, rosaSource } from './inductance-inputs'
import { longSolidSelf, longTubeSelf, solidRoundSelf, tubeSelf } from './round-conductor'

/** Partial self-inductance of a straight piece of wire, trace or bar. */
export const partialInductance = defineMethod({
  id: 'partial-inductance',
  version: 1,
  title: 'Partial inductance of a straight conductor',
  purpose:
    'Gives the partial self-inductance of a straight piece of wire, trace or bar: what it adds to a loop, before the mutual inductances.',
  inputs: {
    shape: {
      kind: 'choice',
      label: 'Shape',
      symbol: 'type',
      help: 'Of the cross-section',
      isRequired: true,
      options: { wire: 'Round wire', bar: 'Trace or bar' },
    },
    length: lengthInput('Length', 'l', 'Of the piece', true),
    radius: lengthInput('Radius of the wire', 'a', 'For a wire', false),
    width: lengthInput('Width', 'w', 'For a trace or bar', false),
    thickness: lengthInput('Thickness', 't', 'For a trace or bar; left empty, 35 µm', false),
  },
  formulas: [
    'L = mean of M(l, d) = (µ₀/2π)[l asinh(l/d) − √(l² + d²) + d] over all pairs of points of the section that carry current',
    'Long wire: L = (µ₀ l/2π)(ln(2l/a) − 1) with the current on the surface, −¾ evenly spread',
    'Trace or bar, usual form: L = (µ₀ l/2π)[ln(2l/(w + t)) + ½ + 0.2235 (w + t)/l]',
  ],
  notes: [
    'Partial inductance is a way of counting: it can be added up around a loop, with all mutual inductances, but a piece alone has none that could be measured.',
    '“10 nH a centimetre” and the like are partial inductances with a return far away: nearer returns take much of it off.',
    'The closed form of 64 terms for a bar loses its digits for long thin ones; the value here is found by quadrature and keeps them.',
  ],
  cautions: loopCautions,
  sources: [
    rosaSource,
    {
      citation:
        'C. Hoer, C. Love, Exact Inductance Equations for Rectangular Conductors, J. Res. NBS 69C, 1965, p. 127',
      standing: 'published',
    },
    derivedHere,
  ],
  example: { shape: 'bar', length: '20 mm', width: '1 mm', thickness: '35 µm' },
  compute: ({ shape, length, radius, width, thickness = 35e-6 }) => {
    if (shape === 'wire') {
      return radius === undefined
        ? err(noSolution('A wire needs its radius.', 'radius'))
        : wireOutcome(length, radius)
    }
    return width === undefined
      ? err(noSolution('A trace or bar needs its width.', 'width'))
      : barOutcome({ width, thickness, length })
  },
})

function wireOutcome(length: number, radius: number): Result<MethodOutcome, MethodError> {
  const [surface, uniform] = [tubeSelf(length, radius), solidRoundSelf(length, radius)]
  return ok({
    results: [
      main('surface', 'Partial inductance, current on the surface', 'L', 'H', surface),
      main('uniform', 'Partial inductance, current evenly spread', 'L', 'H', uniform),
      currentModelSpread(surface, uniform),
      step('longSurface', 'Usual form, current on the surface', 'L', 'H', longTubeSelf(length, radius)),
      step('longUniform', 'Usual form, current evenly spread', 'L', 'H', longSolidSelf(length, radius)),
    ],
    choices: [],
    validity: [slenderness(length, 2 * radius)],
    figures: [],
  })
}

function barOutcome(bar: Bar): Result<MethodOutcome, MethodError> {
  return ok({
    results: [
      main('uniform', 'Partial inductance, current evenly spread', 'L', 'H', barSelf(bar)),
      step('approximate', 'Usual form', 'L', 'H', barSelfApproximate(bar)),
    ],
    choices: [],
    validity: [slenderness(bar.length, bar.width + bar.thickness)],
    figures: [],
  })
}

function slenderness(length: number, across: number): ValidityCheck {
  const passed = length >= 5 * across
  return {
    passed,
    sentence: passed
      ? 'The piece is at least five times as long as it is wide: the usual forms are near the exact value.'
      : 'The piece is short for its width: only the exact values hold, and how the current enters and leaves it matters as much.',
  }
}
