import type Stripe from 'stripe'
import { describe, expect, it } from 'vitest'
import { ApiFailure } from '../failure'
import { indexesOf, listOf, mapOf, parseForm, textOf } from './form'
import { checkParameters, type Shape, type ShapeOf } from './shape'

const shape: Shape = {
  amount: 'integer',
  expand: 'list',
  metadata: 'map',
} satisfies ShapeOf<Stripe.RefundCreateParams>

function refusalOf(act: () => void): ApiFailure {
  try {
    act()
  } catch (error) {
    if (error instanceof ApiFailure) return error
    throw error
  }
  throw new Error('nothing was refused')
}

describe('bracketed form bodies', () => {
  it('keeps nested names whole and numbers the empty brackets', () => {
    const form = parseForm(
      'line_items[0][quantity]=2&line_items[1][quantity]=1&expand[]=a&expand[]=b&metadata[order%20id]=7',
    )
    expect(indexesOf(form, 'line_items')).toEqual(['0', '1'])
    expect(textOf(form, 'line_items[0][quantity]')).toBe('2')
    expect(listOf(form, 'expand')).toEqual(['a', 'b'])
    expect(mapOf(form, 'metadata')).toEqual({ 'order id': '7' })
  })

  it('refuses a parameter it does not know and names it', () => {
    const refused = refusalOf(() => checkParameters(parseForm('amount=5&amonut=5'), shape))
    expect(refused.status).toBe(400)
    expect(refused.body).toMatchObject({ code: 'parameter_unknown', param: 'amonut' })
  })

  it('refuses a nested name under a plain one, and names that belong to every object', () => {
    expect(refusalOf(() => checkParameters(parseForm('amount[cents]=5'), shape)).body.code).toBe(
      'parameter_unknown',
    )
    expect(refusalOf(() => checkParameters(parseForm('constructor=5'), shape)).body.code).toBe(
      'parameter_unknown',
    )
  })

  it('refuses an amount that is no whole number', () => {
    expect(refusalOf(() => checkParameters(parseForm('amount=5.5'), shape)).body).toMatchObject({
      code: 'parameter_invalid_integer',
      param: 'amount',
    })
  })
})
