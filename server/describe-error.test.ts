import { expect, it } from 'vitest'

import { describeError } from '@/server/describe-error'

it('tells what failed and where, and none of the values', () => {
  const driver = Object.assign(new Error("Duplicate entry 'ada@example.org' for key 'user.email'"), {
    code: 'ER_DUP_ENTRY',
    errno: 1062,
    sql: "insert into user values ('ada@example.org')",
  })
  const failed = new Error('Failed query: insert into seller values (?, ?)\nparams: 12 Mill Lane,39.10361', {
    cause: driver,
  })
  const told = describeError(failed)
  expect(told).toMatchObject({
    type: 'Error',
    message: 'Failed query: insert into seller values (?, ?)',
    cause: { code: 'ER_DUP_ENTRY', errno: 1062, message: "Duplicate entry '…' for key '…'" },
  })
  expect(told.at).toContain('describe-error.test')
  expect(JSON.stringify(told)).not.toMatch(/Mill Lane|39\.10361|ada@example/)
})

it('takes what is thrown and is no error', () => {
  expect(describeError('broken')).toEqual({ type: 'string', message: 'broken' })
})
