import { createHash } from 'node:crypto'

import {
  beginText,
  endText,
  fill,
  moveText,
  type PDFDocument,
  type PDFFont,
  type PDFOperator,
  type PDFRef,
  rectangle,
  setFillingRgbColor,
  setFontAndSize,
  showText,
} from '@cantoo/pdf-lib'
import * as fontkit from 'fontkit'

import { err, ok, type Result } from '@/lib/core/result'

import type { SignPdfError } from './sign-pdf-error'
import type { SignatureRequest } from './signature-request'

const LARGEST_TEXT = 9
const SMALLEST_TEXT = 5
const LEADING = 1.35
const PADDING = 6
const RULE_WIDTH = 1.5
/** Ink blue for the text, copper for the rule at its left. */
const INK = [0.09, 0.16, 0.28] as const
const COPPER = [0.65, 0.38, 0.18] as const

/** Draws the visible block as a form XObject: a rule and lines of text in the embedded font, sized to fit. */
export async function drawAppearance(
  document: PDFDocument,
  request: SignatureRequest,
): Promise<Result<PDFRef, SignPdfError>> {
  const { lines } = request.block
  const { width, height } = request.block.rectangle
  const font = await embedFont(document, request)
  if (!font.ok) return font
  const size = fittingSize(font.value, lines, width - 2 * PADDING - RULE_WIDTH, height - 2 * PADDING)
  if (size < SMALLEST_TEXT) {
    return err({
      code: 'block_too_small',
      message: `The text of the signature "${request.field}" does not fit its block; shorten it or enlarge the block.`,
    })
  }
  const content = document.context.contentStream(drawing(font.value, lines, size, height), {
    Type: 'XObject',
    Subtype: 'Form',
    BBox: [0, 0, width, height],
    Resources: { Font: { F1: font.value.ref } },
  })
  return ok(document.context.register(content))
}

function fittingSize(font: PDFFont, lines: readonly string[], width: number, height: number): number {
  const widest = Math.max(...lines.map((line) => font.widthOfTextAtSize(line, 1)))
  return Math.min(LARGEST_TEXT, width / widest, height / (lines.length * LEADING))
}

function drawing(font: PDFFont, lines: readonly string[], size: number, height: number): PDFOperator[] {
  const text = lines.flatMap((line, index) => [
    moveText(index === 0 ? PADDING + RULE_WIDTH : 0, index === 0 ? height - PADDING - size : -size * LEADING),
    showText(font.encodeText(line)),
  ])
  return [
    setFillingRgbColor(...COPPER),
    rectangle(0, 0, RULE_WIDTH, height),
    fill(),
    setFillingRgbColor(...INK),
    beginText(),
    setFontAndSize('F1', size),
    ...text,
    endText(),
  ]
}

async function embedFont(
  document: PDFDocument,
  request: SignatureRequest,
): Promise<Result<PDFFont, SignPdfError>> {
  document.registerFontkit(fontkit)
  const face = fontkit.create(Buffer.from(request.font))
  if (!('hasGlyphForCodePoint' in face))
    throw new Error('The signature needs a single font, not a collection')
  const missing = [...request.block.lines.join('')].find(
    (character) => !face.hasGlyphForCodePoint(character.codePointAt(0) ?? 0),
  )
  if (missing !== undefined) {
    return err({
      code: 'character_missing',
      message: `The report's font cannot show "${missing}", which the text of the signature "${request.field}" holds.`,
    })
  }
  // A fixed subset tag in place of the library's random one, so that equal inputs give equal bytes.
  const customName = `${subsetTag(request.field)}+${face.postscriptName}`
  return ok(await document.embedFont(request.font, { subset: true, customName }))
}

/** Six capitals, the form of a subset tag (ISO 32000-1, 9.6.4), taken from the field's name. */
const subsetTag = (field: string): string =>
  [...createHash('sha256').update(field).digest().subarray(0, 6)]
    .map((byte) => String.fromCharCode(65 + (byte % 26)))
    .join('')
