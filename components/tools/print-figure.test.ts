import { expect, it } from 'vitest'

import { printFigure } from './print-figure'

it.each([
  [0, '0'],
  [0.05731, '0.0573'],
  [0.0999999, '0.1'],
  [1.2, '1.2'],
  [8.2634, '8.26'],
  [340.4, '340'],
  [12345.6, '12,300'],
  [0.000012345, '0.0000123'],
  [-3.14159, '-3.14'],
])('prints %d as %s', (value, text) => expect(printFigure(value)).toBe(text))
