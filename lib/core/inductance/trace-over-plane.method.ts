import { defineMethod } from '../method/method'
import { main, step } from '../method/result-value'
import { ok } from '../result'
import { lengthInput, loopCautions } from './inductance-inputs'
import { stripOverPlane, wideStripOverPlane } from './line'
import { stripOverPlaneWidened } from './thick-strip'

/** Inductance of a trace over a plane. */
export const traceOverPlaneInductance = defineMethod({
  id: 'trace-over-plane-inductance',
  version: 2,
  title: 'Inductance of a trace over a plane',
  purpose:
    'Gives the inductance per length of a trace whose current returns in the plane below, and of a piece of it.',
  inputs: {
    width: lengthInput('Width of the trace', 'w', 'Of the copper', true),
    height: lengthInput('Height over the plane', 'h', 'Thickness of the dielectric', true),
    thickness: lengthInput(
      'Thickness of the trace',
      't',
      'Of the copper; left empty, it is taken as thin',
      false,
    ),
    length: lengthInput('Length', 'l', 'Of the piece; left empty, only the value per length is given', false),
  },
  formulas: [
    'L′ = Z₀/c,   Z₀ = (η₀/2π) ln(F/u + √(1 + 4/u²)),   u = w/h',
    'F = 6 + (2π − 6) exp(−(30.666/u)^0.7528)',
    'With thickness: w becomes w + (t/π) ln[1 + 4e h/(t coth² √(6.517 w/h))]',
    'L = L′ l',
  ],
  notes: [
    '“µ₀ h/w” is the limit of a very wide trace: it is 30 % too high at w/h = 10, 80 % at 3 and 200 % at 1.',
    'The dielectric does not change the inductance.',
    'The thickness of the copper lowers it by a few per cent for narrow traces; leaving it out is the cautious side. The correction is within 0.4 % of boundary elements for traces thinner than they are wide and high.',
  ],
  cautions: loopCautions,
  sources: [
    {
      citation:
        'E. Hammerstad, Ø. Jensen, Accurate Models for Microstrip Computer-Aided Design, IEEE MTT-S Digest 1980, pp. 407–409 (from memory; compared here with an exact solution)',
      standing: 'published',
    },
  ],
  example: { width: '1 mm', height: '0.2 mm', length: '20 mm' },
  compute: ({ width, height, thickness, length }) => {
    const thin = stripOverPlane(width, height)
    const perLength = thickness === undefined ? thin : stripOverPlaneWidened(width, height, thickness)
    const ratio = width / height
    return ok({
      results: [
        main('perLength', 'Inductance per length', 'L′', 'H/m', perLength),
        ...(length === undefined ? [] : [main('inductance', 'Inductance', 'L', 'H', perLength * length)]),
        ...(thickness === undefined
          ? []
          : [step('thin', 'Without thickness, per length', 'L′', 'H/m', thin)]),
        step('ratio', 'Width to height', 'w/h', '', ratio),
        step('wideStrip', 'Popular estimate', 'µ₀ h/w', 'H/m', wideStripOverPlane(width, height)),
      ],
      choices: [],
      validity: [
        {
          passed: true,
          sentence:
            ratio <= 100
              ? 'w/h is at most 100, where the formula is within 0.008 % of the exact solution.'
              : 'w/h is above 100, where the formula is within 0.03 % of the exact solution.',
        },
        ...(thickness === undefined ? [] : [thicknessCheck(thickness, width, height)]),
        ...(length === undefined ? [] : [lengthCheck(length, height)]),
      ],
      figures: [],
    })
  },
})

function thicknessCheck(thickness: number, width: number, height: number) {
  const isThin = thickness <= Math.min(width, height)
  return {
    passed: isThin,
    sentence: isThin
      ? 'The trace is thinner than its width and height, as the correction needs.'
      : 'The trace is thicker than it is wide or high: the correction for thickness no longer holds.',
  }
}

function lengthCheck(length: number, height: number) {
  const isLong = length >= 10 * height
  return {
    passed: isLong,
    sentence: isLong
      ? 'The piece is at least ten heights long: its ends count for little.'
      : 'The piece is shorter than ten heights: its ends and their vias add to the inductance.',
  }
}
