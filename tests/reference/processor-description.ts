import Ajv, { type ValidateFunction } from 'ajv'
import type { RecordedAnswer } from '@/payments/fake/recorder-for-tests'
import extract from './fixtures/stripe-openapi-extract.json'

type Json = boolean | null | number | string | Json[] | { [name: string]: Json }

interface Schema {
  required?: string[]
  properties?: Record<string, Schema>
  items?: Schema
  anyOf?: Schema[]
  additionalProperties?: Schema | boolean
}

interface Spec {
  components: { schemas: Record<string, Schema> }
  paths: Record<string, Record<string, { requestBody?: { content: Record<string, { schema: Schema }> } }>>
}

/** Value of `object` in an answer = name of its schema, for everything the product reads. */
export const objectNames = [
  'account',
  'account_link',
  'balance',
  'balance_transaction',
  'charge',
  'checkout.session',
  'dispute',
  'event',
  'payment_intent',
  'refund',
  'transfer',
  'transfer_reversal',
]

/** OpenAPI 3.0 says `nullable` where JSON Schema has a type of its own for null. */
function asJsonSchema(schema: Json): Json {
  if (Array.isArray(schema)) return schema.map(asJsonSchema)
  if (typeof schema !== 'object' || schema === null) return schema
  const { nullable, format: _format, ...rest } = schema
  const plain = Object.fromEntries(Object.entries(rest).map(([name, inner]) => [name, asJsonSchema(inner)]))
  return nullable === true ? { anyOf: [plain, { type: 'null' }] } : plain
}

const specText = JSON.stringify(extract)
const spec: Spec = JSON.parse(specText)
const specJson: { components: Json } = JSON.parse(specText)
const ajv = new Ajv({ strict: false, allErrors: true })
ajv.addSchema({ $id: 'processor', components: asJsonSchema(specJson.components) })

function validatorOf(name: string): ValidateFunction {
  const found = ajv.getSchema(`processor#/components/schemas/${name}`)
  if (!found) throw new Error(`the description does not hold ${name}`)
  return found
}

/** What is wrong with an answer; empty when the description bears it out. Fields newer than it may be there. */
export function faultsIn(
  answer: RecordedAnswer,
  name = answer.error ? 'error' : (answer.object ?? ''),
): string[] {
  if (name !== 'error' && !objectNames.includes(name)) return [`no schema for "${name}"`]
  const validate = validatorOf(name)
  return validate(answer)
    ? []
    : (validate.errors ?? []).map((fault) => `${name}${fault.instancePath} ${fault.message}`)
}

export function requiredFields(name: string): string[] {
  return spec.components.schemas[name]?.required ?? []
}

function knows(schema: Schema | undefined, segments: string[]): boolean {
  const [head, ...rest] = segments
  if (head === undefined) return true
  if (!schema) return false
  if (schema.anyOf?.some((one) => knows(one, segments))) return true
  const inner = schema.items ?? schema.properties?.[head] ?? schema.additionalProperties
  return typeof inner === 'object' && knows(inner, rest)
}

function bodySchema(path: string): Schema | null {
  const known = Object.keys(spec.paths).find((pattern) =>
    new RegExp(`^${pattern.replace(/\{[^}]+\}/g, '[^/]+')}$`).test(path),
  )
  const operation = known ? spec.paths[known]?.post : undefined
  return operation?.requestBody?.content['application/x-www-form-urlencoded']?.schema ?? null
}

/** Whether a POST to this path takes the parameter `a[0][b]`; null when the path itself is not described. */
export function knowsParameter(path: string, name: string): boolean | null {
  const schema = bodySchema(path)
  return schema && knows(schema, name.split(/[[\]]+/).filter(Boolean))
}
