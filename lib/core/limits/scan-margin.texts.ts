/** The words of the method: what for, by which formulas, what to know besides. */
export const scanMarginTexts = {
  title: 'Margin of a scan',
  purpose: 'Holds a measured scan against a limit line and lists the smallest margins.',
  formulas: [
    'margin = L(f) − (level + k)',
    'L(f) = L₀ + (L₁ − L₀) lg(f/f₀)/lg(f₁/f₀);   the lower limit at a transition',
  ],
  notes: [
    'Each limit says whether its numbers were read in the document, in a related one, or are from memory. Hold them against the edition in force before they are relied on.',
    'A peak scan below a quasi-peak or average limit settles the matter; one above it does not.',
    'Factors that are already in the scan must not be added again.',
    'A limit for field strength holds at its own distance: carry the levels there with the method for distances, and say so.',
  ],
  cautions: [
    'A margin from a pre-compliance scan is an engineering estimate, never a statement of conformity: that is for an accredited laboratory under the standard and edition in force.',
  ],
  sources: [
    { citation: '47 CFR 15.109, 15.209, 15.31, 15.33, 15.35, read in public copies', standing: 'published' },
    {
      citation:
        'CISPR 32:2012 tables A.4 and A.5, as quoted in a public post; other tables marked one by one',
      standing: 'published',
    },
  ],
  example: {
    limit: 'cispr-32-b-mains-quasi-peak',
    detector: 'peak',
    points: '150 kHz; 61.2\n420 kHz; 58.9\n840 kHz; 52.3\n12.6 MHz; 44.0',
  },
} as const
