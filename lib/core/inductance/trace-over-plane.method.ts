import { defineMethod } from '../method/method'
import { main, step } from '../method/result-value'
import { ok } from '../result'
import { lengthInput, loopCautions } from './inductance-inputs'
import { stripOverPlane, wideStripOverPlane } from './line'

/** Inductance of a trace over a plane. */
export const traceOverPlaneInductance = defineMethod({
  id: 'trace-over-plane-inductance',
  version: 1,
  title: 'Inductance of a trace over a plane',
  purpose:
    'Gives the inductance per length of a trace whose current returns in the plane below, and of a piece of it.',
  inputs: {
    width: lengthInput('Width of the trace', 'w', 'Of the copper', true),
    height: lengthInput('Height over the plane', 'h', 'Thickness of the dielectric', true),
    length: lengthInput('Length', 'l', 'Of the piece; left empty, only the value per length is given', false),
  },
  formulas: [
    'L′ = Z₀/c,   Z₀ = (η₀/2π) ln(F/u + √(1 + 4/u²)),   u = w/h',
    'F = 6 + (2π − 6) exp(−(30.666/u)^0.7528)',
    'L = L′ l',
  ],
  notes: [
    '“µ₀ h/w” is the limit of a very wide trace: it is 30 % too high at w/h = 10, 80 % at 3 and 200 % at 1.',
    'The dielectric does not change the inductance.',
    'The thickness of the copper lowers it by a few per cent for narrow traces; it is not included, which is the cautious side.',
  ],
  cautions: loopCautions,
  sources: [
    {
      citation:
        'E. Hammerstad, Ø. Jensen, Accurate Models for Microstrip Computer-Aided Design, IEEE MTT-S Digest 1980, pp. 407–409 (from memory; within 6·10⁻⁵ of an exact solution)',
      standing: 'published',
    },
  ],
  example: { width: '1 mm', height: '0.2 mm', length: '20 mm' },
  compute: ({ width, height, length }) => {
    const perLength = stripOverPlane(width, height)
    const ratio = width / height
    const isInRange = ratio >= 0.07 && ratio <= 33
    return ok({
      results: [
        main('perLength', 'Inductance per length', 'L′', 'H/m', perLength),
        ...(length === undefined ? [] : [main('inductance', 'Inductance', 'L', 'H', perLength * length)]),
        step('ratio', 'Width to height', 'w/h', '', ratio),
        step('wideStrip', 'Popular estimate', 'µ₀ h/w', 'H/m', wideStripOverPlane(width, height)),
      ],
      choices: [],
      validity: [
        {
          passed: isInRange,
          sentence: isInRange
            ? 'w/h is within 0.07 to 33, where the formula is known to be within 0.01 %.'
            : 'w/h is outside 0.07 to 33, where the formula has been checked.',
        },
        ...(length === undefined ? [] : [lengthCheck(length, height)]),
      ],
      figures: [],
    })
  },
})

function lengthCheck(length: number, height: number) {
  const isLong = length >= 10 * height
  return {
    passed: isLong,
    sentence: isLong
      ? 'The piece is at least ten heights long: its ends count for little.'
      : 'The piece is shorter than ten heights: its ends and their vias add to the inductance.',
  }
}
