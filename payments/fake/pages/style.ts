import { createHash } from 'node:crypto'
import { Html } from './html'

const css = `
:root { color-scheme: light; --ink: #22201c; --soft: #5a544a; --paper: #fbf8f1; --sheet: #fff; --line: #8a8274;
  --act: #6b2a10; --warn: #8c1d18; --note: #fff1c9 }
* { box-sizing: border-box }
body { margin: 0; font: 1.0625rem/1.5 system-ui, sans-serif; color: var(--ink); background: var(--paper) }
header, main, footer { max-width: 34rem; margin: 0 auto; padding: 1rem }
main.wide, header.wide, footer.wide { max-width: 72rem }
header p { margin: 0; font-weight: 700 }
.note { background: var(--note); border-left: .375rem solid var(--act); padding: .75rem 1rem; margin: 0 0 1.5rem }
h1 { font-size: 1.75rem; line-height: 1.2; margin: 0 0 1rem }
h2 { font-size: 1.25rem; margin: 2rem 0 .5rem }
p { margin: 0 0 1rem }
dl { margin: 0 0 1.5rem; background: var(--sheet); border: 1px solid var(--line); padding: .75rem 1rem }
dl div { display: flex; justify-content: space-between; gap: 1rem }
dt, dd { margin: 0; overflow-wrap: anywhere }
dd { font-variant-numeric: tabular-nums; white-space: nowrap }
.total { font-weight: 700; border-top: 1px solid var(--line); margin-top: .5rem; padding-top: .5rem }
.field { margin: 0 0 1rem }
.pair { display: grid; grid-template-columns: 1fr 1fr; gap: 1rem }
label { display: block; font-weight: 700 }
.hint { display: block; color: var(--soft); font-size: .9375rem }
input { width: 100%; min-height: 2.75rem; font: inherit; color: inherit; background: var(--sheet);
  border: 1px solid var(--line); border-radius: .25rem; padding: .5rem .75rem }
input[aria-invalid=true] { border: 2px solid var(--warn) }
.wrong { display: block; color: var(--warn); font-weight: 700 }
.problem { border: 2px solid var(--warn); background: var(--sheet); padding: .75rem 1rem; margin: 0 0 1.5rem }
.problem p { margin: 0 }
button, .button { display: inline-block; min-height: 2.75rem; font: inherit; font-weight: 700; text-decoration: none;
  border: 2px solid var(--act); border-radius: .25rem; padding: .5rem 1.25rem; cursor: pointer;
  background: var(--act); color: #fff }
button.second { background: var(--sheet); color: var(--act) }
.acts { display: flex; flex-wrap: wrap; gap: 1rem; align-items: center }
a { color: var(--act) }
.acts a, p > a, td a { display: inline-block; padding: .625rem 0 }
:focus-visible { outline: 3px solid #1f4fbf; outline-offset: 2px }
.cards div { padding: .375rem 0; border-top: 1px solid var(--line) }
.cards div:first-child { border-top: 0 }
summary { cursor: pointer; padding: .625rem 0; font-weight: 700 }
.scroll { overflow-x: auto }
table { border-collapse: collapse; width: 100%; background: var(--sheet); font-size: .9375rem; white-space: nowrap }
caption { text-align: left; font-weight: 700; font-size: 1.25rem; padding: 1.5rem 0 .5rem }
th, td { text-align: left; padding: .375rem .75rem; border: 1px solid var(--line); font-variant-numeric: tabular-nums }
code { font-size: .9375rem }
footer { color: var(--soft); font-size: .9375rem }
`

/** The policy of the pages allows just this style; a space more or less and the browser drops it. */
export const styleHash = createHash('sha256').update(css).digest('base64')

export const styleTag = new Html(`<style>${css}</style>`)
