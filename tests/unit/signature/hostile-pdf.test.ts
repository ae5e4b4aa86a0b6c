import fc from 'fast-check'
import { beforeAll, describe, expect, it } from 'vitest'

import { readPdfFile } from '@/lib/signature/pdf/read-pdf-file'
import { verifyPdf } from '@/lib/signature/verify-pdf'

import { createScene, expectationOf, signByBoth, type SigningScene } from './signing-scene'

const bytesOf = (text: string): Uint8Array => Uint8Array.from(Buffer.from(text, 'latin1'))

/** A minimal file around the given objects, with a correct table. */
function fileOf(objects: readonly string[], trailer = '/Root 1 0 R'): Uint8Array {
  let text = '%PDF-1.7\n'
  const lines = objects.map((object, index) => {
    const offset = text.length
    text += `${index + 1} 0 obj ${object} endobj\n`
    return `${String(offset).padStart(10, '0')} 00000 n \n`
  })
  const table = `xref\n1 ${objects.length}\n${lines.join('')}trailer << /Size ${objects.length + 1} ${trailer} >>\n`
  return bytesOf(`${text}${table}startxref\n${text.length}\n%%EOF`)
}

describe('reading hostile files', () => {
  let scene: SigningScene
  let signed: Uint8Array
  beforeAll(async () => {
    scene = await createScene()
    signed = (await signByBoth(scene)).twice
  })

  it('RB4: never throws on random bytes behind a PDF header', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 2000 }), (bytes) => {
        const file = Buffer.concat([Buffer.from('%PDF-1.7\n'), bytes])
        expect(verifyPdf(file, expectationOf(scene)).valid).toBe(false)
      }),
    )
  })

  it('RB4: never throws on, and never accepts, a signed file with a run of bytes replaced', () => {
    fc.assert(
      fc.property(
        fc.nat(signed.length - 1),
        fc.uint8Array({ minLength: 1, maxLength: 40 }),
        (offset, bytes) => {
          const changed = Uint8Array.from(signed)
          changed.set(bytes.subarray(0, signed.length - offset), offset)
          fc.pre(Buffer.compare(changed, signed) !== 0)
          expect(verifyPdf(changed, expectationOf(scene)).valid).toBe(false)
        },
      ),
      { numRuns: 60 },
    )
  })

  it.each([
    ['a table that points to itself', fileOf(['<< >>'], '/Root 1 0 R /Prev 34')],
    ['nesting without end', fileOf([`${'['.repeat(100_000)}`])],
    ['a string without end', fileOf(['(((('])],
    ['a stream longer than the file', fileOf(['<< /Length 999999 >> stream\n'])],
    ['a stream whose length is itself', fileOf(['<< /Length 1 0 R >> stream\nendstream'])],
    ['encryption', fileOf(['<< >>'], '/Root 1 0 R /Encrypt 1 0 R')],
    ['a hybrid table', fileOf(['<< >>'], '/Root 1 0 R /XRefStm 5')],
    ['a key that is there twice under an escape', fileOf(['<< /Type /Catalog /T#79pe /Pages >>'])],
    ['a comment inside an object', fileOf(['<< /A % 1\n 2 >>'])],
    ['a reused object number', fileOf(['[1 1 R]'])],
  ])('refuses %s', (_, bytes) => {
    expect(readPdfFile(bytes)).toMatchObject({ ok: false, error: { code: 'unreadable' } })
  })

  it('refuses overlapping objects instead of reading them again and again', () => {
    const count = 2000
    let text = '%PDF-1.7\n'
    const lines: string[] = []
    for (let number = 1; number <= count; number++) {
      lines.push(`${String(text.length).padStart(10, '0')} 00000 n \n`)
      text += `${number} 0 obj (`
    }
    text += `${')'.repeat(count)} endobj `
    const offset = text.length
    text += `xref\n1 ${count}\n${lines.join('')}trailer << /Root 1 0 R >>\nstartxref\n${offset}\n%%EOF`
    expect(readPdfFile(bytesOf(text))).toMatchObject({ ok: false, error: { code: 'unreadable' } })
  })

  it.each([
    ['a page tree that loops', ['<< /Pages 2 0 R >>', '<< /Type /Pages /Kids [2 0 R] >>']],
    ['a form that is a number', ['<< /Pages 2 0 R /AcroForm 3 >>', '<< /Type /Pages /Kids [] >>']],
    ['no catalogue', ['7']],
  ])('answers %s with a sentence', (_, objects) => {
    const verdict = verifyPdf(fileOf(objects), expectationOf(scene))
    expect(verdict.problems).toMatchObject([{ code: 'form_unreadable' }])
  })
})
