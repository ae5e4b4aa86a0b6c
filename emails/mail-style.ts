const sans = "'Source Sans 3', 'Segoe UI', Helvetica, Arial, sans-serif"
const serif = "'Source Serif 4', Georgia, 'Times New Roman', serif"
const mono = "'Source Code Pro', Consolas, Menlo, monospace"

/** Styles sit on the elements because many mail programs drop a style sheet; the sheet below only adds the dark theme. */
export const style = {
  body: `margin:0;padding:0;background:#f3ecdd;color:#1b2a4a;font-family:${sans};font-size:16px;line-height:24px`,
  frame: 'width:100%;background:#f3ecdd',
  sheet:
    'width:100%;max-width:560px;background:#fcf9f1;border:1px solid #d9cdb3;border-top:4px solid #9c4f22;text-align:left',
  cell: 'padding:28px 32px',
  practice: `margin:0 0 24px;font-family:${serif};font-size:15px;font-weight:600;color:#415070`,
  heading: `margin:0 0 16px;font-family:${serif};font-size:23px;line-height:29px;font-weight:600;color:#1b2a4a`,
  paragraph: 'margin:0 0 16px',
  button:
    'display:inline-block;padding:10px 18px;background:#9c4f22;color:#fffaf1;font-weight:600;text-decoration:none;border-radius:2px',
  address: 'margin:8px 0 20px;font-size:13px;line-height:18px;color:#59647c;word-break:break-all',
  facts: 'width:100%;border-collapse:collapse;margin:0 0 20px',
  label:
    'padding:6px 16px 6px 0;border-bottom:1px solid #e7dcc5;color:#415070;font-weight:400;text-align:left',
  value: 'padding:6px 0;border-bottom:1px solid #e7dcc5;text-align:right',
  figure: `font-family:${mono};font-size:15px`,
  total: 'font-weight:600;color:#1b2a4a',
  note: 'margin:0 0 16px;padding:0 0 0 12px;border-left:3px solid #d9cdb3;color:#415070;font-size:15px;line-height:22px',
  foot: 'margin:24px 0 0;padding:16px 0 0;border-top:1px solid #d9cdb3;font-size:13px;line-height:18px;color:#59647c',
} as const

export const darkTheme = `
@media (prefers-color-scheme: dark) {
  .ground { background: #121824 !important; color: #ebe5d7 !important }
  .sheet { background: #1a2231 !important; border-color: #313b4f !important; border-top-color: #e39a66 !important }
  .ink { color: #ebe5d7 !important }
  .soft { color: #bfbdb6 !important; border-color: #313b4f !important }
  .faint { color: #9ba0aa !important; border-color: #313b4f !important }
  .row { border-color: #313b4f !important }
  .button { background: #e39a66 !important; color: #1d120a !important }
}`
