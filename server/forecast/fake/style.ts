import { createHash } from 'node:crypto'

import { Html } from './html'

const css = `
:root { color-scheme: light dark; --sky: #eef4f8; --sheet: #fff; --ink: #14212b; --soft: #47586a; --line: #7d8f9f;
  --act: #0b5563; --on-act: #fff; --wrong: #9b1c1c }
@media (prefers-color-scheme: dark) { :root { --sky: #10191f; --sheet: #18242c; --ink: #e8eef2; --soft: #aebbc6;
  --line: #6d7f8e; --act: #7fd3e0; --on-act: #06262c; --wrong: #ffb0a8 } }
* { box-sizing: border-box }
body { margin: 0; font: 1.0625rem/1.5 system-ui, sans-serif; color: var(--ink); background: var(--sky) }
main { max-width: 40rem; margin: 0 auto; padding: 1rem }
h1 { font-size: 1.625rem; line-height: 1.2; margin: .5rem 0 }
h2 { font-size: 1.25rem; margin: 2rem 0 .5rem }
.told { border-left: .375rem solid var(--act); padding: .5rem 1rem; background: var(--sheet) }
form.sheet { background: var(--sheet); border: 1px solid var(--line); border-radius: .5rem; padding: 1rem }
fieldset { border: 0; margin: 0 0 1rem; padding: 0; min-width: 0 }
legend { font-weight: 700; padding: 0 0 .375rem }
.row { display: grid; grid-template-columns: repeat(auto-fit, minmax(8rem, 1fr)); gap: .75rem }
label { display: block; font-weight: 600 }
label.choice { display: flex; align-items: center; gap: .75rem; min-height: 2.75rem; font-weight: 400 }
input[type=radio] { width: 1.375rem; height: 1.375rem; flex: none; margin: 0; accent-color: var(--act) }
input:not([type=radio]) { width: 100%; min-width: 0; min-height: 2.75rem; font: inherit; color: inherit;
  background: var(--sheet); border: 1px solid var(--line); border-radius: .375rem; padding: .5rem .625rem }
input[aria-invalid=true] { border: 2px solid var(--wrong) }
.wrong { display: block; color: var(--wrong); font-weight: 600 }
button { min-height: 2.75rem; font: inherit; font-weight: 700; padding: .5rem 1.25rem; cursor: pointer;
  border: 2px solid var(--act); border-radius: .375rem; background: var(--act); color: var(--on-act) }
button.second { background: none; color: var(--act) }
:focus-visible { outline: 3px solid var(--act); outline-offset: 2px }
ol { list-style: none; margin: 0 0 1rem; padding: 0 }
li { display: flex; flex-wrap: wrap; gap: .5rem 1rem; justify-content: space-between; align-items: center;
  border-top: 1px solid var(--line); padding: .75rem 0 }
li p { margin: 0; overflow-wrap: anywhere }
small { color: var(--soft); font-size: .9375rem }
`

/** The policy of the page allows just this style. */
export const styleHash = createHash('sha256').update(css).digest('base64')

export const styleTag = new Html(`<style>${css}</style>`)
