import { describe, expect, it } from 'vitest'
import { gramsFromPounds, parseMassG, printMass } from '@/shared/units/mass'

describe('masses', () => {
  it('reads pounds, ounces, grams and kilograms', () => {
    expect(parseMassG('2 lb', 'metric')).toBeCloseTo(907.18474, 6)
    expect(parseMassG('8 oz', 'us')).toBeCloseTo(226.796185, 6)
    expect(parseMassG('40 g', 'us')).toBe(40)
    expect(parseMassG('1.2', 'metric')).toBe(1200)
    expect(parseMassG('heavy', 'us')).toBeNull()
  })

  it('prints the unit that suits the size', () => {
    expect(printMass(gramsFromPounds(2.5), 'us')).toBe('2.5 lb')
    expect(printMass(gramsFromPounds(0.5), 'us')).toBe('8 oz')
    expect(printMass(1.9, 'us')).toBe('0.07 oz')
    expect(printMass(1.9, 'metric')).toBe('1.9 g')
    expect(printMass(1100, 'metric')).toBe('1.1 kg')
    expect(printMass(gramsFromPounds(1500), 'us')).toBe('1,500 lb')
  })
})
