import path from 'node:path'

import { Font } from '@react-pdf/renderer'

/** Full font files: a subset lacks Ω or √, and a missing glyph would silently come from another font. */
export const families = {
  text: 'Source Sans 3',
  heading: 'Source Serif 4',
  number: 'Source Code Pro',
} as const

export const fontFile = (name: string): string =>
  path.join(/* turbopackIgnore: true */ process.cwd(), 'pdf', 'fonts', `${name}.ttf`)

let isRegistered = false

/** Makes the report's fonts known to the renderer, once. Words are never hyphenated. */
export function registerFonts(): void {
  if (isRegistered) return
  isRegistered = true
  Font.register({
    family: families.text,
    fonts: [
      { src: fontFile('SourceSans3-Regular') },
      { src: fontFile('SourceSans3-Semibold'), fontWeight: 600 },
      { src: fontFile('SourceSans3-It'), fontStyle: 'italic' },
    ],
  })
  Font.register({
    family: families.heading,
    fonts: [
      { src: fontFile('SourceSerif4-Regular') },
      { src: fontFile('SourceSerif4-Semibold'), fontWeight: 600 },
    ],
  })
  Font.register({
    family: families.number,
    fonts: [
      { src: fontFile('SourceCodePro-Regular') },
      { src: fontFile('SourceCodePro-Semibold'), fontWeight: 600 },
    ],
  })
  Font.registerHyphenationCallback((word) => [word])
}
