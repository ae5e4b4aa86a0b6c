import { html, type Html } from './html'
import type { Block, Fact, MailContent, Practice, RenderedMail } from './mail-content'
import { darkTheme, style } from './mail-style'
import { plainText } from './plain-text'

/** Sets a message as HTML and as its plain-text twin. No pictures, nothing remote, nothing that reports back. */
export function layOutMail(content: MailContent, practice: Practice): RenderedMail {
  return {
    subject: oneLine(content.subject),
    html: page(content, practice).markup,
    text: plainText(content, practice),
  }
}

/** A subject is one header line, whatever was typed into a title. */
const oneLine = (text: string): string =>
  text
    .replace(/[\p{Cc}\u2028\u2029]+/gu, ' ')
    .replace(/ {2,}/g, ' ')
    .trim()

const page = (content: MailContent, practice: Practice): Html =>
  html`<!doctype html>
    <html lang="en">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <meta name="color-scheme" content="light dark" />
        <title>${content.subject}</title>
        <style>
          ${{ markup: darkTheme }}
        </style>
      </head>
      <body class="ground" style="${style.body}">
        <div role="main">
          <table role="presentation" class="ground" style="${style.frame}" cellpadding="0" cellspacing="0">
            <tr>
              <td align="center" style="padding:24px 12px">
                <table
                  role="presentation"
                  class="sheet"
                  style="${style.sheet}"
                  cellpadding="0"
                  cellspacing="0"
                >
                  <tr>
                    <td style="${style.cell}">
                      <p class="soft" style="${style.practice}">${practice.name}</p>
                      <h1 class="ink" style="${style.heading}">${content.heading}</h1>
                      ${content.blocks.map(block)}
                      <p class="faint" style="${style.foot}">
                        ${content.reason}<br />${practice.name}${practice.address ? `, ${practice.address}` : ''}
                      </p>
                    </td>
                  </tr>
                </table>
              </td>
            </tr>
          </table>
        </div>
      </body>
    </html> `

function block(part: Block): Html {
  switch (part.kind) {
    case 'paragraph':
      return html`<p style="${style.paragraph}">${part.text}</p>`
    case 'note':
      return html`<p class="soft" style="${style.note}">${part.text}</p>`
    case 'link':
      return html`<p style="margin:0">
          <a class="button" style="${style.button}" href="${absolute(part.href)}">${part.label}</a>
        </p>
        <p class="faint" style="${style.address}">Or copy this address: ${part.href}</p>`
    case 'facts':
      return html`<table style="${style.facts}">
        ${part.facts.map(row)}
      </table>`
  }
}

const row = ({ label, value, set }: Fact): Html => {
  const weight = set === 'total' ? `;${style.total}` : ''
  const face = set === 'word' ? '' : `;${style.figure}`
  return html`<tr>
    <th scope="row" class="${set === 'total' ? 'row ink' : 'soft'}" style="${style.label}${weight}">
      ${label}
    </th>
    <td class="${set === 'total' ? 'row ink' : 'row'}" style="${style.value}${face}${weight}">${value}</td>
  </tr> `
}

/** A mail has no address of its own to which a link could be relative; anything else than the web is a bug. */
function absolute(href: string): string {
  const { protocol } = new URL(href)
  if (protocol !== 'https:' && protocol !== 'http:') throw new Error(`A mail cannot link to ${protocol}`)
  return href
}
