import { mkdtemp, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import path from 'node:path'

import { afterAll, describe, expect, it } from 'vitest'

import { countTests } from '@/scripts/count-tests.mjs'

describe('counting tests', async () => {
  const folder = await mkdtemp(path.join(tmpdir(), 'tankward-count-'))
  afterAll(() => rm(folder, { recursive: true, force: true }))
  const counted = async (report: object) => {
    const file = path.join(folder, 'report.json')
    await writeFile(file, JSON.stringify(report))
    return countTests(file)
  }

  it('takes the runner at its word', async () => {
    const files = [{ status: 'failed', assertionResults: [{}, {}, {}] }]
    expect(await counted({ numPassedTests: 2, numFailedTests: 1, testResults: files })).toEqual({
      passed: 2,
      failed: 1,
    })
  })

  it('counts a file that could not be loaded as failed', async () => {
    const files = [{ status: 'failed', assertionResults: [] }]
    expect(await counted({ numPassedTests: 0, numFailedTests: 0, testResults: files })).toEqual({
      passed: 0,
      failed: 1,
    })
  })

  it('knows no count when the runner wrote nothing', async () => {
    expect(await countTests(path.join(folder, 'absent.json'))).toBeNull()
  })
})
