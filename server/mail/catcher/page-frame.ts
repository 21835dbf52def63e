const MARKS: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' }

export const escapeHtml = (text: string): string => text.replace(/[&<>"']/g, (mark) => MARKS[mark] ?? mark)

export const STYLE = `
:root { color-scheme: light dark; --ground: #fbfaf7; --ink: #1c1b19; --quiet: #55524b; --line: #cfcabf; --link: #0b4f8a }
@media (prefers-color-scheme: dark) {
  :root { --ground: #17181a; --ink: #ececea; --quiet: #b4b3ae; --line: #45464a; --link: #9bcbff }
}
* { box-sizing: border-box }
body { margin: 0; background: var(--ground); color: var(--ink); font: 17px/1.5 system-ui, sans-serif }
header, main { max-width: 46rem; margin: 0 auto; padding: 0 1rem }
h1 { font-size: 1.5rem; line-height: 1.25; overflow-wrap: anywhere }
a { color: var(--link) }
:focus-visible { outline: 3px solid var(--link); outline-offset: 2px }
ol { list-style: none; margin: 0; padding: 0; border-top: 1px solid var(--line) }
li { border-bottom: 1px solid var(--line) }
li a { display: block; padding: .75rem 0; min-height: 44px; text-decoration: none; color: var(--ink) }
li a strong { color: var(--link); overflow-wrap: anywhere }
small, dt { display: block; color: var(--quiet); font-size: .9rem; overflow-wrap: anywhere }
dl { display: grid; grid-template-columns: max-content 1fr; gap: .25rem 1rem; align-items: baseline }
dd { margin: 0; overflow-wrap: anywhere }
pre { white-space: pre-wrap; overflow-wrap: anywhere; font: inherit; border: 1px solid var(--line); padding: 1rem }
iframe { width: 100%; height: 36rem; border: 1px solid var(--line); background: #fff }
nav a { display: inline-block; padding: .6rem 1rem .6rem 0; min-height: 44px }
`

/** A whole page around `body`, which is HTML already. */
export function pageFrame(title: string, body: string): string {
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escapeHtml(title)}</title>
<link rel="stylesheet" href="/style.css">
</head>
<body>
${body}
</body>
</html>
`
}
