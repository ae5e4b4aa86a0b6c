/** The look of the fakes' own pages: a sheet of the bench notebook, so plainly set that nobody takes it for a shop. */
export const pageStyle = `
@font-face { font-family: Text; src: url(/fonts/SourceSans3-Regular.woff2) }
@font-face { font-family: Text; font-weight: 600; src: url(/fonts/SourceSans3-Semibold.woff2) }
@font-face { font-family: Heading; font-weight: 600; src: url(/fonts/SourceSerif4-Semibold.woff2) }
@font-face { font-family: Figures; src: url(/fonts/SourceCodePro-Regular.woff2) }
:root {
  color-scheme: light dark;
  --ground: light-dark(#f3ecdd, #121824); --sheet: light-dark(#fcf9f1, #1a2231); --grid: light-dark(#e7dcc5, #1b2434);
  --ink: light-dark(#1b2a4a, #ebe5d7); --soft: light-dark(#415070, #bfbdb6); --faint: light-dark(#59647c, #9ba0aa);
  --rule: light-dark(#d9cdb3, #313b4f); --edge: light-dark(#857a62, #76819a);
  --copper: light-dark(#9c4f22, #e39a66); --wash: light-dark(#f5e2d0, #39291f); --on-copper: light-dark(#fffaf1, #1d120a);
  --red: light-dark(#9e2b1b, #f29480); --red-wash: light-dark(#f7dfd6, #3c2422); --focus: light-dark(#1f4fb8, #9dbcff);
}
* { box-sizing: border-box }
body { margin: 0; background: var(--ground); color: var(--ink); font: 16px/1.5 Text, system-ui, sans-serif }
.banner { padding: .5rem 1rem; background: var(--wash); border-bottom: 2px solid var(--copper); text-align: center; font-weight: 600 }
main { max-width: 38rem; margin: 2rem auto; padding: 0 1rem 3rem }
main.wide { max-width: 76rem }
h1, h2 { font-family: Heading, Georgia, serif; font-weight: 600; line-height: 1.25; margin: 0 0 .75rem }
h1 { font-size: 1.75rem } h2 { font-size: 1.25rem; margin-top: 2rem }
a { color: inherit; text-decoration-color: var(--copper); text-underline-offset: .2em }
:focus-visible { outline: 2px solid var(--focus); outline-offset: 2px }
.sheet { background: var(--sheet); border: 1px solid var(--rule); border-top: 4px solid var(--copper); padding: 1.5rem }
.soft { color: var(--soft) } .num { font-family: Figures, monospace; font-variant-numeric: tabular-nums }
dl { display: grid; grid-template-columns: auto 1fr; gap: .375rem 1.5rem; margin: 0 0 1.5rem; padding: .75rem 0; border-block: 1px solid var(--rule) }
dt { color: var(--soft) } dd { margin: 0; text-align: right; overflow-wrap: anywhere }
form { display: inline } form.stack { display: grid; gap: .75rem } form.row { display: flex; flex-wrap: wrap; gap: .75rem; align-items: end }
label { display: grid; gap: .25rem; color: var(--soft); font-size: .9375rem }
input, select, button { font: inherit; min-height: 2.5rem; border-radius: 2px; border: 1px solid var(--edge); background: var(--sheet); color: var(--ink); padding: .375rem .75rem }
button { cursor: pointer } button:hover { border-color: var(--copper) }
button.main { background: var(--copper); border-color: var(--copper); color: var(--on-copper); font-weight: 600 }
td button { min-height: 2rem; padding: .125rem .5rem; font-size: .875rem }
.refusal { margin: 0 0 1rem; padding: .75rem 1rem; background: var(--red-wash); border-left: 4px solid var(--red) }
.scroll { overflow-x: auto } table { border-collapse: collapse; width: 100%; background: var(--sheet); font-size: .9375rem }
th, td { padding: .5rem .75rem; border: 1px solid var(--rule); text-align: left; vertical-align: top } th { color: var(--soft); font-weight: 600 }
td { min-width: 7rem } td.num { text-align: right; white-space: nowrap } td.code { font-family: Figures, monospace; font-size: .875rem }
dl.plain dd { text-align: left }
pre { white-space: pre-wrap; overflow-wrap: anywhere; background: var(--sheet); border: 1px solid var(--rule); padding: 1rem; font: .9375rem/1.5 Figures, monospace }
iframe { width: 100%; height: 46rem; border: 1px solid var(--rule); background: var(--sheet) }
`
