import { describe, expect, it } from 'vitest'

import { renderMail } from '@/emails/render-mail'
import type { Mail } from '@/lib/domain/mail'

const practice = { name: 'Tarn Hollow EMC', address: '1 Weir Lane' }
const hostile = `<img src=x onerror="alert('1')">&amp;`
const link = 'https://portal.example/invitation/abc?a=1&b="2'

const mails: readonly Mail[] = [
  {
    kind: 'invitation',
    companyName: hostile,
    role: 'purchaser',
    invitedBy: hostile,
    link,
    expiresAt: Date.UTC(2026, 11, 8, 9, 5),
  },
  { kind: 'one_time_link', purpose: 'invitation', link, expiresAt: Date.UTC(2026, 11, 1, 10, 24) },
  { kind: 'one_time_link', purpose: 'password_reset', link, expiresAt: Date.UTC(2026, 11, 1, 10, 24) },
  {
    kind: 'receipt',
    receiptNumber: 17,
    companyName: hostile,
    title: 'Twenty hours',
    minutes: 1_230,
    netCents: 123_450,
    taxCents: 24_690,
    taxLabel: 'VAT 20 %',
    grossCents: 148_140,
    currency: 'EUR',
    paidAt: Date.UTC(2026, 11, 1),
    balanceMinutes: 1_545,
    validUntil: Date.UTC(2027, 10, 30),
  },
  { kind: 'scope_proposed', engagementTitle: hostile, capMinutes: 600, proposedBy: hostile, link },
  {
    kind: 'report_released',
    engagementTitle: hostile,
    reportNumber: 'TH-2026-004',
    revision: 2,
    link,
    checkLink: 'https://portal.example/check',
    checkCode: 'k7wq-2m4d',
  },
]

describe.each(mails.map((mail) => [mail.kind, mail] as const))('a mail of kind %s', (_kind, mail) => {
  const rendered = renderMail(mail, practice)

  it('shows what people typed as text, never as markup', () => {
    expect(rendered.html).not.toContain('<img')
    expect(rendered.html).not.toMatch(/<[^>]*onerror/)
    expect(rendered.html.includes('&lt;img src=x onerror=&quot;')).toBe(JSON.stringify(mail).includes('<img'))
  })

  it('loads nothing and reports nothing back', () => {
    expect(rendered.html).not.toMatch(/<(img|script|link|iframe|object)\b|url\(|@import/i)
  })

  it('links only to absolute addresses, the same ones in both parts', () => {
    const addresses = [...rendered.html.matchAll(/href="([^"]*)"/g)].map(([, address = '']) =>
      address.replaceAll('&quot;', '"').replaceAll('&amp;', '&'),
    )
    for (const address of addresses) {
      expect(address).toMatch(/^https:\/\//)
      expect(rendered.text).toContain(address)
    }
    expect(addresses.length).toBe(rendered.text.match(/^https:/gm)?.length ?? 0)
  })

  it('names the practice and says why it was sent', () => {
    for (const part of [rendered.html, rendered.text]) {
      expect(part).toContain('Tarn Hollow EMC')
      expect(part).toContain('You receive this because')
    }
  })
})

describe('particular mails', () => {
  const textOf = (mail: Mail | undefined) => (mail ? renderMail(mail, practice).text : '')

  it('write a receipt with hours, net, tax and total lined up', () => {
    expect(textOf(mails[3])).toContain(
      [
        'Block          Twenty hours',
        'Hours           20 h 30 min',
        'Paid on     1 December 2026',
        'Net            1,234.50 EUR',
        'VAT 20 %         246.90 EUR',
        'Total paid     1,481.40 EUR',
      ].join('\n'),
    )
    expect(textOf(mails[3])).toMatch(/Balance after this purchase\s+25 h 45 min/)
  })

  it('say until when an invitation is open, in UTC', () => {
    expect(textOf(mails[0])).toContain('8 December 2026, 09:05 UTC')
  })

  it('keep a subject on one line, whatever a title holds', () => {
    const rendered = renderMail(
      {
        kind: 'scope_proposed',
        engagementTitle: 'Buck\r\nBcc: thief@elsewhere.example',
        capMinutes: 60,
        proposedBy: 'A',
        link,
      },
      practice,
    )
    expect(rendered.subject).toBe('Scope to approve: Buck Bcc: thief@elsewhere.example')
  })

  it('refuse a link that is not of the web', () => {
    const mail: Mail = {
      kind: 'one_time_link',
      purpose: 'invitation',
      link: 'javascript:alert(1)',
      expiresAt: 0,
    }
    expect(() => renderMail(mail, practice)).toThrow(/cannot link/)
  })
})
