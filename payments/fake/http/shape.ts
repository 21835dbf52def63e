import { badParameter } from '../failure'
import { segmentsOf, type Form } from './form'

export type Kind = 'boolean' | 'integer' | 'list' | 'map' | 'text'

/** The parameters an endpoint of this practice processor takes. */
export interface Shape {
  readonly [name: string]: Kind | Shape | readonly [Shape]
}

type Inner<V> = V extends readonly (infer E)[] ? readonly [ShapeOf<E>] : V extends object ? ShapeOf<V> : never

/** Ties a shape to the SDK's parameter type, so that a name the processor does not know is a type error. */
export type ShapeOf<P> = { readonly [K in keyof P]?: Kind | Inner<NonNullable<P[K]>> }

const BOOLEAN = /^(true|false)$/
const INTEGER = /^-?\d{1,15}$/

function isList(part: Shape | readonly [Shape]): part is readonly [Shape] {
  return Array.isArray(part)
}

function unknown(name: string): never {
  throw badParameter(name, `Received unknown parameter: ${name}`, 'parameter_unknown')
}

function kindOf(name: string, shape: Shape): Kind {
  let here: Kind | Shape | readonly [Shape] | undefined = shape
  for (const segment of segmentsOf(name)) {
    if (here === undefined) return unknown(name)
    if (here === 'map' || here === 'list') return 'text'
    if (typeof here === 'string') return unknown(name)
    if (isList(here)) {
      if (!/^\d+$/.test(segment)) return unknown(name)
      here = here[0]
      continue
    }
    here = Object.hasOwn(here, segment) ? here[segment] : undefined
  }
  // `metadata=` (empty) unsets the whole map; a bare object or list has no value of its own.
  if (here === 'map' || here === 'list') return 'text'
  return typeof here === 'string' ? here : unknown(name)
}

export function checkParameters(form: Form, shape: Shape): void {
  for (const [name, value] of form) {
    const kind = kindOf(name, shape)
    if (kind === 'integer' && value !== '' && !INTEGER.test(value)) {
      throw badParameter(name, `Invalid integer: ${value}`, 'parameter_invalid_integer')
    }
    if (kind === 'boolean' && !BOOLEAN.test(value)) throw badParameter(name, `Invalid boolean: ${value}`)
  }
}
