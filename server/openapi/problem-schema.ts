import { problems } from '@/shared/api/problem'

/** RFC 9457 as we write it: the types are a closed list, so a client can switch on them. */
export const problemSchema = {
  type: 'object',
  required: ['type', 'title', 'status', 'detail'],
  properties: {
    type: { type: 'string', enum: Object.keys(problems).map((slug) => `/problems/${slug}`) },
    title: { type: 'string' },
    status: { type: 'integer', minimum: 400, maximum: 599 },
    detail: { type: 'string', description: 'A sentence a beginner can act on.' },
    instance: { type: 'string' },
    errors: {
      type: 'array',
      items: {
        type: 'object',
        required: ['detail', 'pointer'],
        properties: { detail: { type: 'string' }, pointer: { type: 'string' } },
      },
    },
    facts: { type: 'object', additionalProperties: { type: ['string', 'number', 'boolean'] } },
  },
} as const
