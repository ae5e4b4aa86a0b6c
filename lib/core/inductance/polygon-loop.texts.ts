import { derivedHere, loopCautions } from './inductance-inputs'

export const polygonLoopTexts = {
  title: 'Inductance of a drawn loop',
  purpose:
    'Gives the inductance of a loop of any outline, such as a hot loop read off a layout, with or without a plane below.',
  formulas: [
    'L = (µ₀/4π) Σᵢ Σⱼ ∬ cos ε ds dt / R, between the outline and a copy of it at the distance g',
    'g: geometric mean distance of the conductor: r with the current on the surface, 0.7788 r evenly spread, about 0.2235 (w + t) for a trace',
    'Over a plane: L = M(g) − M(2h), the outline and its mirror image',
  ],
  notes: [
    'The answer does not depend on the first corner, on the direction, or on how sides are divided. The sum of partial inductances, shown beside it, does: it grows by 4 % for a circle of 24 pieces.',
    'Corners leave about 1 % open: claim no better.',
    'The plane is taken as perfect and without end. A slot below the loop gives up what it takes away.',
    'At high frequency the current of a trace crowds to its edges, and over a plane to the side that faces it; the inductance is then a few per cent lower.',
  ],
  cautions: loopCautions,
  sources: [
    { citation: 'F. E. Neumann’s integral of 1845 for mutual inductance', standing: 'published' },
    {
      citation:
        'G. A. Campbell, Mutual Inductances of Circuits Composed of Straight Wires, Physical Review 5, 1915 (from memory)',
      standing: 'published',
    },
    {
      citation:
        'J. C. Maxwell, A Treatise on Electricity and Magnetism, art. 691–692, geometric mean distance (from memory)',
      standing: 'published',
    },
    derivedHere,
  ],
} as const
