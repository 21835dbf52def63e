import { html, type Html } from './html'
import { whereWords, type RuleErrors, type Typed } from './read-rule'
import { styleTag } from './style'
import type { WeatherRule } from './weather'
import { modes, type Mode } from './weather-book'

export interface Shown {
  rules: readonly WeatherRule[]
  mode: Mode
  /** What stands in the form: the last try, or days to begin with. */
  typed: Typed
  errors: RuleErrors
}

const modeWords: Record<Mode, string> = {
  normal: 'Answers normally',
  refuses: 'Refuses: every ask gets an error (500)',
  hangs: 'Hangs: takes the ask and never answers',
  objects: 'Objects: says that the ask is wrong (400)',
}

const degrees = (airC: number) => `${Math.round(airC * 1.8 + 32)} °F (${Math.round(airC * 10) / 10} °C)`

interface Field {
  name: string
  label: string
  type: 'date' | 'text'
}

function field({ name, label, type }: Field, { typed, errors }: Shown): Html {
  const error = errors[name]
  const mode = type === 'text' ? html`inputmode="text"` : null
  return html`<div>
    <label for="${name}">${label}</label>
    <input
      id="${name}"
      name="${name}"
      type="${type}"
      value="${typed[name] ?? ''}"
      ${mode}
      autocomplete="off"
      aria-invalid="${error ? 'true' : 'false'}"
      aria-describedby="${name}-wrong"
    />
    <span class="wrong" id="${name}-wrong">${error ?? ''}</span>
  </div>`
}

function choice(name: string, value: string, words: { label: string; isChosen: boolean }): Html {
  const chosen = words.isChosen ? html`checked` : null
  return html`<label class="choice"
    ><input type="radio" name="${name}" value="${value}" ${chosen} />${words.label}</label
  >`
}

function ruleForm(shown: Shown): Html {
  const { typed } = shown
  const isNear = typed.where === 'near'
  return html`<form class="sheet" method="post" action="/rules">
    <fieldset>
      <legend>Where</legend>
      ${choice('where', 'everywhere', { label: 'Everywhere', isChosen: !isNear })}
      ${choice('where', 'near', { label: 'Only around this point:', isChosen: isNear })}
      <div class="row">
        ${field({ name: 'lat', label: 'Latitude', type: 'text' }, shown)}
        ${field({ name: 'lng', label: 'Longitude', type: 'text' }, shown)}
        ${field({ name: 'miles', label: 'Miles around', type: 'text' }, shown)}
      </div>
    </fieldset>
    <fieldset>
      <legend>When</legend>
      <div class="row">
        ${field({ name: 'from', label: 'First day', type: 'date' }, shown)}
        ${field({ name: 'until', label: 'Last day', type: 'date' }, shown)}
      </div>
    </fieldset>
    <fieldset>
      <legend>Air</legend>
      <div class="row">
        ${field({ name: 'low', label: 'Low, about 6 am', type: 'text' }, shown)}
        ${field({ name: 'high', label: 'High, about 3 pm', type: 'text' }, shown)}
      </div>
      ${choice('unit', 'F', { label: 'Degrees Fahrenheit', isChosen: typed.unit !== 'C' })}
      ${choice('unit', 'C', { label: 'Degrees Celsius', isChosen: typed.unit === 'C' })}
    </fieldset>
    <button>Set this weather</button>
  </form>`
}

function ruleRow(rule: WeatherRule): Html {
  const days = rule.from === rule.until ? rule.from : `${rule.from} to ${rule.until}`
  const words = `${whereWords(rule)}, ${days}`
  return html`<li>
    <p>
      <strong>${degrees(rule.minC)} to ${degrees(rule.maxC)}</strong><br />
      <small>${words}</small>
    </p>
    <form method="post" action="/rules/${rule.id}/remove">
      <button class="second" aria-label="Remove: ${words}">Remove</button>
    </form>
  </li>`
}

function ruleList(rules: readonly WeatherRule[]): Html {
  if (rules.length === 0) {
    return html`<p>Nothing is set: it is mild everywhere, 50 to 55 °F at night and 63 to 70 °F by day.</p>`
  }
  return html`<p>Where two hold for a day, the upper one wins. Elsewhere it is mild.</p>
    <ol>
      ${rules.toReversed().map(ruleRow)}
    </ol>
    <form method="post" action="/rules/clear"><button class="second">Remove all</button></form>`
}

export function weatherPage(shown: Shown): string {
  const title = Object.keys(shown.errors).length > 0 ? 'Not set yet' : 'Practice weather'
  return html`<!doctype html>
    <html lang="en">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <title>${title} – practice forecast</title>
        ${styleTag}
      </head>
      <body>
        <main>
          <h1>Practice weather</h1>
          <p class="told">
            <strong>All of this is invented.</strong> This page runs on your own computer and stands in for a
            forecast service. Set the weather that you want to try out.
          </p>
          <h2>Set weather</h2>
          ${ruleForm(shown)}
          <h2>What is set</h2>
          ${ruleList(shown.rules)}
          <h2>How the service behaves</h2>
          <form class="sheet" method="post" action="/mode">
            <fieldset>
              <legend>When it is asked for a forecast</legend>
              ${modes.map((mode) =>
                choice('mode', mode, { label: modeWords[mode], isChosen: mode === shown.mode }),
              )}
            </fieldset>
            <button>Behave like this</button>
          </form>
          <p>
            <small
              >What is set here shows in the product within ten minutes: it keeps each forecast that
              long.</small
            >
          </p>
        </main>
      </body>
    </html>`.markup
}
