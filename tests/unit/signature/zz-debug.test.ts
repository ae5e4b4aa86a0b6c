import { it } from 'vitest'
import { writeFileSync } from 'node:fs'
import { createScene, signByBoth, expectationOf } from './signing-scene'
import { verifyPdf } from '@/lib/signature/verify-pdf'
it('x', async () => {
  const scene = await createScene()
  const { twice } = await signByBoth(scene)
  const t = Buffer.from(twice).toString('latin1')
  console.log(twice.length)
  let t0 = performance.now()
  for (let i=0;i<20;i++) verifyPdf(twice, expectationOf(scene))
  console.log('ms', (performance.now()-t0)/20)
  for (const m of [...t.matchAll(/\/Contents <([0-9a-f]+)>/g)]) {
    const s = m.index + '/Contents <'.length
    const len = 2*(4+Buffer.from(m[1].slice(4,8),'hex').readUInt16BE(0))
    writeFileSync('/tmp/c.der', Buffer.from(m[1].slice(0,len),'hex'))
    console.log('der', len/2)
    for (let o=s;o<s+len;o++) { const f=Uint8Array.from(twice); f[o]^=1; const v=verifyPdf(f, expectationOf(scene)); if (v.valid) console.log('ACCEPT', o-s, Math.floor((o-s)/2), t.slice(o-8,o+8)) }
  }
}, 600000)
