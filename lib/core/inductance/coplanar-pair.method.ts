import { defineMethod } from '../method/method'
import { main, step } from '../method/result-value'
import { ok } from '../result'
import { coplanarPair, coplanarPairUniform } from './coplanar-pair'
import { currentModelSpread, derivedHere, lengthInput, loopCautions } from './inductance-inputs'

/** Inductance of two traces side by side that carry a current forth and back. */
export const coplanarPairInductance = defineMethod({
  id: 'coplanar-pair-inductance',
  version: 1,
  title: 'Inductance of two traces side by side',
  purpose:
    'Gives the inductance per length of a trace and its return trace beside it on the same layer, without a plane.',
  inputs: {
    width1: lengthInput('Width of the trace', 'w₁', 'Of the copper', true),
    width2: lengthInput('Width of the return', 'w₂', 'Of the copper; left empty, like the first', false),
    gap: lengthInput('Gap', 's', 'From edge to edge', true),
    length: lengthInput('Length', 'l', 'Of the pair; left empty, only the value per length is given', false),
  },
  formulas: [
    'Current crowded to the edges (skin and proximity effect): L′ = (µ₀/2) K(k)/K(k′),   k² = s (s + w₁ + w₂)/((s + w₁)(s + w₂)),   k′² = 1 − k²',
    'Current evenly spread: L′ = (µ₀/2π)(2 ln g₁₂ − ln g₁ − ln g₂), geometric mean distances of the strips',
    'L = L′ l',
  ],
  notes: [
    'K is the complete elliptic integral of the first kind of the modulus k. Tables and programs often take m = k²: a common slip.',
    'The copper is taken as thin. Its thickness lowers the value by a few per cent for narrow gaps.',
    'The dielectric does not change the inductance; a plane below lowers it by much.',
  ],
  cautions: loopCautions,
  sources: [
    {
      citation: 'NIST Digital Library of Mathematical Functions, 19.8, elliptic integrals',
      standing: 'published',
    },
    {
      citation:
        'J. C. Maxwell, A Treatise on Electricity and Magnetism, art. 691–693, geometric mean distance (from memory)',
      standing: 'published',
    },
    derivedHere,
  ],
  example: { width1: '1 mm', gap: '0.2 mm', length: '20 mm' },
  compute: ({ width1, width2 = width1, gap, length }) => {
    const pair = { width1, width2, gap }
    const [edges, uniform] = [coplanarPair(pair), coplanarPairUniform(pair)]
    return ok({
      results: [
        main('edges', 'Inductance per length, current at the edges', 'L′', 'H/m', edges),
        main('uniform', 'Inductance per length, current evenly spread', 'L′', 'H/m', uniform),
        ...(length === undefined
          ? []
          : [main('inductance', 'Inductance, current at the edges', 'L', 'H', edges * length)]),
        { ...currentModelSpread(edges, uniform), unit: 'H/m' },
        step('gapRatio', 'Gap to width', 's/w', '', gap / Math.min(width1, width2)),
      ],
      choices: [],
      validity:
        length === undefined
          ? []
          : [
              {
                passed: length >= 5 * (gap + width1 + width2),
                sentence:
                  length >= 5 * (gap + width1 + width2)
                    ? 'The pair is long against its width: its ends matter little.'
                    : 'The pair is short against its width: its ends are not included. Use the form for a drawn loop.',
              },
            ],
      figures: [],
    })
  },
})
