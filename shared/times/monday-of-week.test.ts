import { expect, it } from 'vitest'

import { mondayOfWeek } from './monday-of-week'

// Weeks of ISO 8601 around the turn of years with 52 and 53 of them.
it.each([
  [2026, 1, '2025-12-29'],
  [2026, 53, '2026-12-28'],
  [2027, 1, '2027-01-04'],
  [2027, 52, '2027-12-27'],
  [2024, 9, '2024-02-26'],
  [2020, 53, '2020-12-28'],
])('week %i-%i begins on %s', (year, week, monday) => expect(mondayOfWeek(year, week)).toBe(monday))
