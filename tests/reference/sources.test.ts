import { readdirSync } from 'node:fs'
import path from 'node:path'
import { describe, expect, it } from 'vitest'

import type { Equation } from '@/shared/domain/equation'
import { printSource, sources, type SourceKey } from '@/shared/sources'

const domain = path.resolve('shared/domain')

function isEquation(value: unknown): value is Equation {
  return typeof value === 'object' && value !== null && 'validFor' in value && 'sourceKeys' in value
}

async function everyExport(): Promise<[name: string, value: unknown][]> {
  const files = readdirSync(domain, { recursive: true, encoding: 'utf8' }).filter(
    (file) => file.endsWith('.ts') && !/\.test\.ts$|-for-tests\.ts$/.test(file),
  )
  const modules = await Promise.all(
    files.map((file) => import(path.join(domain, file)) as Promise<Record<string, unknown>>),
  )
  return modules.flatMap((one) => Object.entries(one))
}

const found = await everyExport()
const equations = found.filter((one): one is [string, Equation] => isEquation(one[1]))

describe('every equation of the domain', () => {
  it('is found by this test', () => expect(equations.length).toBeGreaterThanOrEqual(12))

  it.each(equations)('%s says what it is, where it holds and who published it', (_name, equation) => {
    expect(equation.text.length).toBeGreaterThan(10)
    expect(equation.validFor.length).toBeGreaterThan(10)
    expect(equation.sourceKeys.length).toBeGreaterThan(0)
    for (const key of equation.sourceKeys) {
      expect(Object.keys(sources)).toContain(key)
      expect(printSource(key).length).toBeGreaterThan(10)
    }
  })

  it('is not one of its sources alone: lists named …Sources hold known keys too', () => {
    const lists = found.filter(
      ([name, value]) => /Sources?$/.test(name) && name !== 'sources' && Boolean(value),
    )
    expect(lists.length).toBeGreaterThan(5)
    for (const [name, value] of lists) {
      const keys = (Array.isArray(value) ? value : [value]) as SourceKey[]
      for (const key of keys) if (typeof key === 'string') expect(Object.keys(sources), name).toContain(key)
    }
  })
})
