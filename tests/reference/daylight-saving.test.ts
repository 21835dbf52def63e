import ICAL from 'ical.js'
import { describe, expect, it } from 'vitest'

import { batchBody } from '@/seed/batch-body'
import { dayOf } from '@/server/listings/day-of'
import { instantOf } from '@/server/listings/instant-of'
import { planWindows } from '@/server/listings/plan-windows'
import { resolveWindows } from '@/server/listings/resolve-windows'
import type { WindowRow } from '@/server/listings/window-store'
import { quietUntil } from '@/server/notices/quiet-until'
import { isReminderDue, reminderMoment } from '@/server/notices/reminder-moments'
import { dayOn, wallInstant } from '@/server/notices/wall-instant'
import { orderCalendar } from '@/server/orders/order-calendar'
import { slotText, type LetterFacts } from '@/server/orders/letters/letter-facts'
import { printMoment, printSlot } from '@/shared/times/print-time'
import {
  changing,
  daysAround,
  edges,
  halfHoursAround,
  still,
  wallText,
  type Edge,
} from '@/tests/reference/us-clock-edges'

const HOUR_MS = 3_600_000
const DAY_MS = 24 * HOUR_MS
const zones = [...changing, ...still]
/** For what takes long to ask. */
const someZones = ['America/New_York', 'America/Indiana/Knox', 'America/Phoenix', 'Pacific/Honolulu']
const doesChange = (zone: string) => (changing as readonly string[]).includes(zone)
const everywhere = zones.flatMap((zone) => edges.map((edge) => ({ zone, edge })))

const halfHours = Array.from(
  { length: 48 },
  (_, at) => `${String(at >> 1).padStart(2, '0')}:${at % 2 === 0 ? '00' : '30'}`,
)
const soonBefore = (day: string) => new Date(Date.parse(`${day}T12:00:00Z`) - 10 * DAY_MS)

/** Half-hour windows over the whole day, and one over the night. */
const typedOn = (day: string) =>
  [
    ...halfHours.slice(1).map((until, at) => [halfHours[at] ?? '', until] as const),
    ['00:30', '05:00'] as const,
  ].map(([from, until]) => ({ day, from, until, capacity: 1 }))

describe('the clocks of the United States from 2024 to 2030', () => {
  it('change in each zone on the days of the law and on no other', () => {
    for (const zone of zones) {
      const found: string[] = []
      for (let ms = Date.UTC(2024, 0, 1, 12); ms < Date.UTC(2031, 0, 1); ms += DAY_MS) {
        // Local noon to local noon: the wall moves by 24 hours, unless the clocks changed in between.
        const [before, after] = [ms - DAY_MS, ms].map((at) => Date.parse(`${wallText(at, zone)}Z`) - at)
        if (before !== after) found.push(wallText(ms, zone).slice(0, 10))
      }
      expect(found, zone).toEqual(doesChange(zone) ? edges.map(({ day }) => day) : [])
    }
    expect(edges).toHaveLength(14)
    expect(edges.slice(4, 6)).toEqual([
      { kind: 'spring', day: '2026-03-08' },
      { kind: 'autumn', day: '2026-11-01' },
    ])
  })

  it('jump over two to three, or show one to two twice', () => {
    for (const { zone, edge } of everywhere) {
      const shown = halfHoursAround(edge.day, zone)
      const odd = halfHours.filter((time) => shown.get(`${edge.day}T${time}`)?.length !== 1)
      const expected = edge.kind === 'spring' ? ['02:00', '02:30'] : ['01:00', '01:30']
      expect(odd, `${zone} ${edge.day}`).toEqual(doesChange(zone) ? expected : [])
    }
  })
})

/** Every time of the three days, read as the product reads it and as Intl shows it. */
function misread({ zone, edge }: { zone: string; edge: Edge }, read: typeof instantOf): string[] {
  const shown = halfHoursAround(edge.day, zone)
  const reached = new Map<number, number>()
  const faults: string[] = []
  for (const day of daysAround(edge.day)) {
    for (const time of halfHours) {
      const wanted = shown.get(`${day}T${time}`) ?? []
      const is = read(day, time, zone)
      const kind = ['never', 'once', 'twice'][wanted.length]
      const isRight = is.kind === kind && (is.kind !== 'once' || is.at.getTime() === wanted[0])
      if (!isRight) faults.push(`${zone} ${day} ${time}: ${is.kind}, not ${kind}`)
      if (is.kind === 'once') reached.set(is.at.getTime(), (reached.get(is.at.getTime()) ?? 0) + 1)
      if (is.kind === 'once' && wallText(is.at.getTime(), zone) !== `${day}T${time}`)
        faults.push(`${zone} ${day} ${time}: the wall shows ${wallText(is.at.getTime(), zone)}`)
      if (is.kind === 'once' && dayOf(is.at, zone) !== day) faults.push(`${zone} ${day} ${time}: another day`)
    }
  }
  const days = daysAround(edge.day)
  for (const [text, instants] of shown) {
    if (!days.includes(text.slice(0, 10)) || instants.length > 1) continue
    if (reached.get(instants[0] ?? 0) !== 1) faults.push(`${zone} ${text}: lost`)
  }
  if ([...reached.values()].some((times) => times > 1)) faults.push(`${zone} ${edge.day}: an instant twice`)
  return faults
}

describe('a time typed around a change of the clocks', () => {
  it('is the instant at which the wall shows it; what never or twice comes is known; none is lost or made twice', () => {
    expect(everywhere.flatMap((at) => misread(at, instantOf))).toEqual([])
  })

  it('would be caught by this test: a reader that takes the offset of the day before', () => {
    const careless: typeof instantOf = (day, time, zone) => {
      const asUtc = Date.parse(`${day}T${time}:00Z`)
      const dayBefore = asUtc - DAY_MS
      const offset = Date.parse(`${wallText(dayBefore, zone)}Z`) - dayBefore
      return { kind: 'once', at: new Date(asUtc - offset) }
    }
    const faults = everywhere.flatMap((at) => misread(at, careless))
    expect(faults.some((fault) => fault.endsWith('lost'))).toBe(true)
    expect(faults.some((fault) => fault.startsWith('America/Phoenix'))).toBe(false)
  })
})

const rowOf = (
  id: number,
  window: { startsAt: Date; endsAt: Date; capacity: number },
  zone: string,
): WindowRow => ({
  ...{ id, publicId: `w${id}`, listingId: 1, ...window, zone, taken: 0, placeKind: 'farm-gate', closed: 0 },
})

describe('pickup windows typed around a change of the clocks', () => {
  it('become as many windows; those that begin or end in the gap or the double hour are refused in words', () => {
    for (const { zone, edge } of everywhere) {
      for (const day of daysAround(edge.day)) {
        const at = soonBefore(day)
        const typed = typedOn(day)
        const { windows, errors } = resolveWindows(typed, { zone, at })
        const name = `${zone} ${day}`
        const isOdd = day === edge.day && doesChange(zone)
        // Three windows touch the two odd half hours; the one between them does with both of its ends.
        expect(windows, name).toHaveLength(typed.length - (isOdd ? 3 : 0))
        const words = edge.kind === 'spring' ? 'The clocks jump over that time' : 'comes twice on that day'
        expect(
          errors.every(({ detail }) => detail.includes(words)),
          name,
        ).toBe(true)
        expect(new Set(errors.map(({ pointer }) => pointer)).size, name).toBe(isOdd ? 4 : 0)
        const night = windows.at(-1)
        const hours = isOdd ? (edge.kind === 'spring' ? 3.5 : 5.5) : 4.5
        expect(((night?.endsAt.getTime() ?? 0) - (night?.startsAt.getTime() ?? 0)) / HOUR_MS, name).toBe(
          hours,
        )
        for (const { startsAt, endsAt } of windows) {
          expect(endsAt.getTime() - startsAt.getTime()).toBeGreaterThan(0)
          expect(wallText(startsAt.getTime(), zone).slice(0, 10)).toBe(day)
        }
      }
    }
  })

  it('are found again when the same is typed again: none is closed, none is added', () => {
    for (const { zone, edge } of everywhere) {
      const at = soonBefore(edge.day)
      const { windows } = resolveWindows(daysAround(edge.day).flatMap(typedOn), { zone, at })
      const rows = windows.map((window, id) => rowOf(id, window, zone))
      const again = resolveWindows(daysAround(edge.day).flatMap(typedOn), { zone, at }).windows
      const plan = planWindows(rows, again, at)
      expect(plan).toMatchObject({ add: [], close: [], problems: [] })
      expect(plan.change).toHaveLength(rows.length)
    }
  })

  it('move when the farm moves to another zone, but never from under a buyer', () => {
    for (const { day } of edges) {
      const at = soonBefore(day)
      const typed = [{ day, from: '09:00', until: '10:00', capacity: 2 }]
      const [old] = resolveWindows(typed, { zone: 'America/New_York', at }).windows
      const { windows } = resolveWindows(typed, { zone: 'America/Chicago', at })
      if (!old) throw new Error('9:00 comes every day')
      const row = rowOf(1, old, 'America/New_York')
      expect(planWindows([row], windows, at)).toMatchObject({ add: windows, close: [1], problems: [] })
      expect(windows[0]?.startsAt.getTime()).toBe(old.startsAt.getTime() + HOUR_MS)
      const held = planWindows([{ ...row, taken: 1 }], windows, at)
      expect(held.close).toEqual([])
      expect(held.problems).toEqual([expect.stringContaining('9:00 AM: it cannot be moved')])
    }
  })
})

interface Slot {
  startsAt: Date
  endsAt: Date
  zone: string
}

const person = { memberId: 'm', name: 'Bea', email: 'bea@example.org' }

/** What the letters and the calendar file of an order take from it; nothing of it but the slot matters here. */
function factsOf({ startsAt, endsAt, zone }: Slot): LetterFacts {
  const order = {
    ...{ publicId: 'p'.repeat(22), state: 'scheduled', quantity: 25, freeze: 'none' },
    ...{ slotStartsAt: startsAt, slotEndsAt: endsAt, zone, balancePaidAt: null, balanceCents: 100 },
  }
  return {
    order,
    terms: batchBody(startsAt, {}),
    seller: { farmName: 'Marsh', street: '1 Mill', city: 'X', state: 'OH', zip: '45202', phone: '' },
    ...{ buyer: person, sellerPerson: person, origin: 'https://tankward.example' },
    agreement: { agreedAt: startsAt, sequence: 0 },
  } as unknown as LetterFacts
}

/** The times of a calendar file, by a reader of its own. */
function readCalendar(text: string): { startsAt: Date; endsAt: Date } {
  const event = new ICAL.Event(
    new ICAL.Component(ICAL.parse(text) as unknown[]).getFirstSubcomponent('vevent') ?? undefined,
  )
  return { startsAt: event.startDate.toJSDate(), endsAt: event.endDate.toJSDate() }
}

/** Times that are looked at on the days before and after. */
const near = ['01:30', '02:00', '02:30', '03:00']

/**
 * Every half hour of real time in the night of the change as a slot, the double hour too (a slot is an instant, however
 * it came), and some of the nights beside it; short ones and ones that go over the change.
 */
function slotsAround({ zone, edge }: { zone: string; edge: Edge }): Slot[] {
  const [before, day, after] = daysAround(edge.day)
  const wanted = new Set([
    ...halfHours.slice(0, 10).map((time) => `${day}T${time}`),
    ...near.flatMap((time) => [`${before}T${time}`, `${after}T${time}`]),
  ])
  return [...halfHoursAround(edge.day, zone)]
    .filter(([text]) => wanted.has(text))
    .flatMap(([, instants]) => instants)
    .flatMap((ms) =>
      [0.5, 3].map((hours) => ({ startsAt: new Date(ms), endsAt: new Date(ms + hours * HOUR_MS), zone })),
    )
}

const printed = ({ startsAt, endsAt, zone }: Slot) =>
  printSlot({ startsAt: startsAt.toISOString(), endsAt: endsAt.toISOString(), zone })

/** In what the page, the mail and the calendar file of one order differ. */
function slotFaults(slot: Slot, facts: LetterFacts, file: string): string[] {
  const read = readCalendar(file)
  const page = printed(slot)
  return [
    ...(printed({ ...slot, ...read }) === page ? [] : [`${slot.zone} ${page}: the file says otherwise`]),
    ...(+read.startsAt === +slot.startsAt && +read.endsAt === +slot.endsAt ? [] : [`${page}: moved`]),
    ...(slotText(facts) === page ? [] : [`${slot.zone} ${page}: the mail says ${slotText(facts)}`]),
  ]
}

describe('the words of a pickup and its calendar file', () => {
  it('tell the same to the page, to the mail and to a calendar program, at every half hour', () => {
    const slots = everywhere.flatMap(slotsAround)
    const faults = slots.flatMap((slot) => {
      const facts = factsOf(slot)
      return slotFaults(slot, facts, orderCalendar(facts, 'buyer')?.text ?? '')
    })
    expect(faults).toEqual([])
    // Ten half hours of the night and eight beside it; two fewer in spring and two more in autumn where clocks change.
    expect(slots).toHaveLength(everywhere.length * 18 * 2)
  })

  it('would be caught when they differ: a file with the first of two hours for the second', () => {
    const second = new Date('2026-11-01T06:30:00Z')
    const slot = { startsAt: second, endsAt: new Date(+second + HOUR_MS), zone: 'America/New_York' }
    const facts = factsOf(slot)
    const file = orderCalendar(facts, 'buyer')?.text ?? ''
    expect(slotFaults(slot, facts, file)).toEqual([])
    expect(slotFaults(slot, facts, file.replace('20261101T063000Z', '20261101T053000Z'))).toHaveLength(2)
  })

  it('name each instant apart: no two slots have the same words, and both ends have their zone', () => {
    for (const at of everywhere.filter(({ zone }) => someZones.includes(zone))) {
      const slots = slotsAround(at)
      expect(new Set(slots.map(printed)).size, `${at.zone} ${at.edge.day}`).toBe(slots.length)
      for (const slot of slots) {
        const zoneAt = (end: Date) => printMoment(end.toISOString(), slot.zone).split(' ').at(-1) ?? ''
        const [from, until] = printed(slot).split(' to ')
        expect(until?.split(' ').at(-1)).toBe(zoneAt(slot.endsAt))
        // One name for both, unless the clocks change in between.
        const own = zoneAt(slot.startsAt)
        expect(from?.endsWith(own), printed(slot)).toBe(own !== zoneAt(slot.endsAt))
      }
    }
  })
})

describe('reminders around a change of the clocks', () => {
  const agreedAt = new Date('2023-12-01T00:00:00Z')

  it('come on the evening before at six of the wall, and two hours before by the stopwatch', () => {
    for (const { zone, edge } of everywhere) {
      for (const slot of slotsAround({ zone, edge })) {
        const pickup = { startsAt: slot.startsAt, zone, agreedAt }
        const evening = reminderMoment('evening-before', pickup).getTime()
        expect(wallText(evening, zone)).toBe(
          `${dayOn(wallText(+slot.startsAt, zone).slice(0, 10), -1)}T18:00`,
        )
        const ahead = +slot.startsAt - evening
        expect(ahead).toBeGreaterThanOrEqual(5 * HOUR_MS)
        expect(ahead).toBeLessThan(32 * HOUR_MS)
        expect(+slot.startsAt - reminderMoment('two-hours-before', pickup).getTime()).toBe(2 * HOUR_MS)
      }
    }
  })

  it('are due in one stretch of time each, quiet hours or not: none is lost, none comes again', () => {
    const wishes = [
      null,
      { from: '22:00', until: '07:00' },
      { from: '17:00', until: '02:30' },
      { from: '01:15', until: '01:45' },
    ]
    for (const { zone, edge } of everywhere.filter((at) => someZones.includes(at.zone))) {
      for (const time of ['00:30', '01:30', '02:30', '03:00', '09:00']) {
        const [start] = halfHoursAround(edge.day, zone).get(`${edge.day}T${time}`) ?? []
        if (start === undefined) continue
        const pickup = { startsAt: new Date(start), zone, agreedAt }
        for (const wish of wishes) {
          const quiet = wish && { ...wish, zone }
          for (const kind of ['evening-before', 'two-hours-before'] as const) {
            let begun = 0
            let wasDue = false
            for (let ms = start - 36 * HOUR_MS; ms < start + HOUR_MS; ms += HOUR_MS / 2) {
              const isDue = isReminderDue(kind, pickup, { at: new Date(ms), quiet })
              if (isDue && !wasDue) begun++
              wasDue = isDue
            }
            const held = quiet && quietUntil(reminderMoment(kind, pickup), quiet)
            // An evening that is quiet until two hours before leaves it to the last reminder.
            const isLeft = kind === 'evening-before' && held && +held >= start - 2 * HOUR_MS
            expect(begun, `${kind} ${zone} ${edge.day} ${time} ${wish?.from}`).toBe(isLeft ? 0 : 1)
          }
        }
      }
    }
  })

  it('read the wall: what it shows once, the first of two, and after a jump as long as typed', () => {
    for (const { zone, edge } of everywhere) {
      const shown = halfHoursAround(edge.day, zone)
      for (const day of daysAround(edge.day)) {
        for (const time of halfHours) {
          const [first] = shown.get(`${day}T${time}`) ?? []
          // The gap is an hour: half past two by the old offset is half past three by the new one.
          const [after] = shown.get(`${day}T03:${time.slice(3)}`) ?? []
          expect(wallInstant(day, time, zone).getTime(), `${zone} ${day} ${time}`).toBe(first ?? after)
        }
      }
    }
  })
})
