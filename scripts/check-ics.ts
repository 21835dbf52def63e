// `npm run check:ics`: calendar files by RFC 5545, byte by byte. `--cases n`: fewer; `--plant-fault`: must be noticed.
import { parseArgs } from 'node:util'

import * as fc from 'fast-check'
import ICAL from 'ical.js'

import { goodEvent } from './calendar/good-file'
import { madeEvents, madeLives } from './calendar/made-events'
import { plantedFiles, plantedSeries } from './calendar/planted-faults'
import { writeReport } from './write-report.mjs'

import { agreementOf } from '@/server/orders/slot-agreement'
import { calendarFaults } from '@/shared/calendar/calendar-faults'
import { readText } from '@/shared/calendar/calendar-text'
import { readLines } from '@/shared/calendar/read-lines'
import { realTime } from '@/shared/calendar/real-time'
import { seriesFaults } from '@/shared/calendar/series-faults'
import { writeCalendar, type CalendarEvent } from '@/shared/calendar/write-calendar'

const SEED = 5545
const { values } = parseArgs({
  options: { cases: { type: 'string', default: '2000' }, 'plant-fault': { type: 'boolean', default: false } },
})
const cases = Number(values.cases)
const isSpoiled = values['plant-fault']
const encoder = new TextEncoder()

/** What the planted fault does to every file: the lines end as on a plain text file. */
const fileOf = (event: CalendarEvent) =>
  encoder.encode(isSpoiled ? writeCalendar(event).replaceAll('\r\n', '\n') : writeCalendar(event))

/** A text as it must come back: one kind of line break, no control characters, no half characters. */
const plain = (text: string) =>
  new TextDecoder()
    .decode(encoder.encode(text))
    .replace(/\r\n?|[\u0085\u2028\u2029]/gu, '\n')
    .replace(/[\u0000-\u0008\u000b-\u001f\u007f]/gu, '')

/** What stands in the file against what was to be written, by our own reader. */
function lost(event: CalendarEvent, bytes: Uint8Array): string[] {
  const { lines } = readLines(bytes)
  const valueOf = (name: string) => lines.find((line) => line.name === name)?.value ?? ''
  const { summary, description, location = '' } = event
  const texts = Object.entries({ SUMMARY: summary, DESCRIPTION: description, LOCATION: location })
  return [
    ...texts.filter(([name, text]) => readText(valueOf(name)) !== plain(text)).map(([name]) => name),
    ...(realTime(valueOf('DTSTART'))?.ms === event.startsAt.getTime() ? [] : ['DTSTART']),
    ...(realTime(valueOf('DTEND'))?.ms === event.endsAt.getTime() ? [] : ['DTEND']),
  ].map((name) => `${name} was lost`)
}

/** The same by a reader that others wrote: it is lenient, so it tells only whether what it reads is what we meant. */
function readOtherwise(event: CalendarEvent, bytes: Uint8Array): string[] {
  const parsed: unknown = ICAL.parse(new TextDecoder().decode(bytes))
  const inside = new ICAL.Component(parsed as unknown[]).getFirstSubcomponent('vevent')
  if (!inside) return ['ical.js finds no event']
  const read = new ICAL.Event(inside)
  return [
    ...(read.summary === plain(event.summary) ? [] : ['summary']),
    ...(read.description === plain(event.description) ? [] : ['description']),
    ...(read.sequence === event.sequence ? [] : ['sequence']),
    ...(read.startDate.toJSDate().getTime() === event.startsAt.getTime() ? [] : ['start']),
    ...(read.endDate.toJSDate().getTime() === event.endsAt.getTime() ? [] : ['end']),
  ].map((name) => `ical.js reads another ${name}`)
}

/** The files of one order's life, each with the SEQUENCE that its events give. */
function filesOf(life: { starts: number[]; isCancelled: boolean }): Uint8Array[] {
  const events = life.starts.map((_, at) => ({
    fromState: at === 0 ? 'deposit_paid' : 'ready',
    toState: 'scheduled',
    at: new Date(at),
  }))
  const over = { fromState: 'scheduled', toState: 'cancelled', at: new Date(99) }
  const steps = life.starts.map((start, at) => ({ start, told: events.slice(0, at + 1), isCancelled: false }))
  const last = life.starts.at(-1) ?? 0
  if (life.isCancelled) steps.push({ start: last, told: [...events, over], isCancelled: true })
  return steps.map(({ start, told, isCancelled }) => {
    // The planted fault forgets to count.
    const sequence = isSpoiled ? 0 : (agreementOf(told)?.sequence ?? -1)
    const [startsAt, endsAt] = [new Date(start), new Date(start + 3_600_000)]
    return encoder.encode(writeCalendar({ ...goodEvent, startsAt, endsAt, sequence, isCancelled }))
  })
}

/** How many were faultless; the first that was not is shown. */
function countGood<T>(made: T[], faultsOf: (one: T) => string[]): number {
  const bad = made.map((one) => ({ one, faults: faultsOf(one) })).filter(({ faults }) => faults.length > 0)
  const [first] = bad
  if (first && !isSpoiled) console.log(JSON.stringify(first))
  return made.length - bad.length
}

async function run(): Promise<void> {
  const goodFiles = countGood(fc.sample(madeEvents, { numRuns: cases, seed: SEED }), (event) => {
    const bytes = fileOf(event)
    return [...calendarFaults(bytes), ...lost(event, bytes), ...readOtherwise(event, bytes)]
  })
  const lives = fc
    .sample(madeLives, { numRuns: cases, seed: SEED })
    .filter((life) => life.starts.length > 1 || life.isCancelled)
  const goodSeries = countGood(lives, (life) => {
    const files = filesOf(life)
    return [...seriesFaults(files), ...files.flatMap(calendarFaults)]
  })
  const missed = [
    ...plantedFiles.filter(({ bytes }) => calendarFaults(bytes).length === 0),
    ...plantedSeries.filter(({ files }) => seriesFaults(files).length === 0),
  ].map(({ name }) => name)
  const planted = plantedFiles.length + plantedSeries.length

  if (isSpoiled) {
    process.exitCode = goodFiles < cases && goodSeries < lives.length ? 1 : 0
    return
  }
  for (const name of missed) console.log(`not found: ${name}`)
  const figures = [
    { id: 'WEB-7-good-files', figure: goodFiles, bar: cases },
    { id: 'WEB-7-good-series', figure: goodSeries, bar: lives.length },
    { id: 'WEB-7-planted-faults-found', figure: planted - missed.length, bar: planted },
  ]
  for (const one of figures) await writeReport({ ...one, pass: one.figure === one.bar, seed: SEED })
  if (figures.some((one) => one.figure !== one.bar)) process.exitCode = 1
}

run().catch((error: unknown) => {
  console.error(error)
  process.exitCode = 2
})
