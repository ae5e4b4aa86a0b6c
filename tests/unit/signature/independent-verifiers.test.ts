import { execFileSync, spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'

import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { createScene, drawExtraText, signByBoth, type SigningScene, updateWith } from './signing-scene'

const hasTool = (name: string): boolean => spawnSync('sh', ['-c', `command -v ${name}`]).status === 0

/** Tools that share no code with the portal: poppler and NSS, qpdf, OpenSSL. */
describe('what independent verifiers say of a signed report', () => {
  let scene: SigningScene
  let twice: Uint8Array
  const directory = mkdtempSync(path.join(tmpdir(), 'signed-report-'))
  const file = (name: string) => path.join(directory, name)
  const run = (tool: string, ...args: string[]) =>
    execFileSync(tool, args, { encoding: 'utf8', stdio: 'pipe' })

  beforeAll(async () => {
    scene = await createScene()
    twice = (await signByBoth(scene)).twice
    writeFileSync(file('signed.pdf'), twice)
    writeFileSync(file('authority.pem'), scene.authority.certificatePem)
  })
  afterAll(() => rmSync(directory, { recursive: true }))

  it.runIf(hasTool('pdfsig') && hasTool('certutil'))(
    'BZ3: poppler finds both signatures valid and trusted',
    () => {
      run('certutil', '-N', '-d', directory, '--empty-password')
      run('certutil', '-A', '-d', directory, '-n', 'authority', '-t', ',C,', '-i', file('authority.pem'))
      const text = run('pdfsig', '-nssdir', directory, file('signed.pdf'))
      expect(text.match(/Signature is Valid/g)).toHaveLength(2)
      expect(text.match(/Certificate is Trusted/g)).toHaveLength(2)
      expect(text).toContain('Signer Certificate Common Name: Ada Example')
      expect(text.match(/Signature Type: ETSI.CAdES.detached/g)).toHaveLength(2)
      expect(text.match(/Total document signed/g)).toHaveLength(1)
    },
  )

  it.runIf(hasTool('pdfsig'))('BZ3: poppler notices a changed byte', () => {
    const changed = Uint8Array.from(twice)
    changed[200] = (changed[200] ?? 0) ^ 1
    writeFileSync(file('changed.pdf'), changed)
    expect(run('pdfsig', '-nocert', file('changed.pdf'))).toContain('Digest Mismatch')
  })

  it.runIf(hasTool('pdfsig'))('poppler sees the added text only as a part that is not signed', async () => {
    writeFileSync(file('added.pdf'), await updateWith(twice, drawExtraText))
    const text = run('pdfsig', '-nocert', file('added.pdf'))
    expect(text.match(/Signature is Valid/g)).toHaveLength(2)
    expect(text).not.toContain('Total document signed')
  })

  it.runIf(hasTool('qpdf'))('qpdf finds no fault in the structure', () => {
    expect(run('qpdf', '--check', file('signed.pdf'))).toContain('No syntax or stream encoding errors found')
  })

  it.runIf(hasTool('openssl'))('BZ3: OpenSSL accepts both containers as CAdES over their byte ranges', () => {
    const text = Buffer.from(twice).toString('latin1')
    const places = [...text.matchAll(/\/ByteRange \[0 (\d+) (\d+) (\d+) *\]\s*\/Contents <([0-9a-f]+)>/g)]
    expect(places).toHaveLength(2)
    for (const [, gapStart, gapEnd, length, hex = ''] of places) {
      const tail = twice.subarray(Number(gapEnd), Number(gapEnd) + Number(length))
      writeFileSync(file('content'), Buffer.concat([twice.subarray(0, Number(gapStart)), tail]))
      const container = Buffer.from(hex, 'hex')
      writeFileSync(file('container.der'), container.subarray(0, 4 + container.readUInt16BE(2)))
      const verified = spawnSync(
        'openssl',
        [
          'cms',
          '-verify',
          '-cades',
          '-binary',
          '-inform',
          'DER',
          '-in',
          file('container.der'),
          '-content',
          file('content'),
        ].concat([
          '-CAfile',
          file('authority.pem'),
          '-purpose',
          'smimesign',
          '-attime',
          '1796126400',
          '-out',
          '/dev/null',
        ]),
        { encoding: 'utf8' },
      )
      expect(verified.stderr).toMatch(/CAdES Verification successful/i)
      expect(verified.status).toBe(0)
    }
  })

  it.runIf(hasTool('pdffonts') && hasTool('pdftotext'))(
    'poppler reads the visible blocks, in embedded fonts only',
    () => {
      const fonts = run('pdffonts', file('signed.pdf'))
      expect(fonts).not.toMatch(/Helvetica/)
      const rows = fonts.trim().split('\n').slice(2)
      expect(rows.length).toBeGreaterThanOrEqual(1)
      for (const row of rows) expect(row).toMatch(/yes yes yes/)
      const text = run('pdftotext', '-layout', file('signed.pdf'), '-')
      expect(text).toContain('Signed as author by Ada Example')
      expect(text).toContain('Signed as reviewer by Bo Müller, Dr.')
    },
  )
})
