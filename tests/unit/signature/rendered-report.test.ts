import { Document, Font, Page, renderToBuffer, Text } from '@react-pdf/renderer'
import { createElement } from 'react'
import { expect, it } from 'vitest'

import { signPdf } from '@/lib/signature/sign-pdf'
import { verifyPdf } from '@/lib/signature/verify-pdf'

import { createScene, expectationOf, NOW, requestFor, valueOf } from './signing-scene'

it('BZ3: a report from the renderer is signed by both and verifies', async () => {
  Font.register({ family: 'Source Sans 3', src: 'pdf/fonts/SourceSans3-Regular.ttf' })
  const page = (text: string) =>
    createElement(
      Page,
      { size: 'A4', style: { fontFamily: 'Source Sans 3', padding: 60 } },
      createElement(Text, null, text),
    )
  const report = await renderToBuffer(
    createElement(
      Document,
      { pdfVersion: '1.7', title: 'Ring at 180 MHz', creationDate: new Date(NOW) },
      page('Z₀ = 14.2 Ω ± 5 %'),
      page('Signatures'),
    ),
  )
  const scene = await createScene()
  const once = valueOf(await signPdf(Uint8Array.from(report), requestFor(scene, 'author')))
  const twice = valueOf(await signPdf(once, requestFor(scene, 'reviewer')))
  expect(verifyPdf(twice, expectationOf(scene))).toMatchObject({ valid: true, problems: [] })
})
