import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import path from 'node:path'

import { afterEach, beforeEach, describe, expect, it } from 'vitest'

import { packagesAreCurrent } from '@/scripts/packages-are-current.mjs'

const here = { version: '1.0.0', integrity: 'sha512-a' }

describe('whether the packages have to be installed', () => {
  let root: string
  beforeEach(async () => {
    root = await mkdtemp(path.join(tmpdir(), 'tankward-packages-'))
    await writePackages('package-lock.json', {
      '': {},
      'node_modules/a': here,
      'node_modules/b': { ...here, optional: true },
    })
    await mkdir(path.join(root, 'node_modules/a'), { recursive: true })
    await writeFile(path.join(root, 'node_modules/a/package.json'), '{}')
    await writePackages('node_modules/.package-lock.json', { 'node_modules/a': here })
  })
  afterEach(() => rm(root, { recursive: true, force: true }))

  const writePackages = (file: string, packages: object) =>
    writeFile(path.join(root, file), JSON.stringify({ packages }))

  it('no: all are there, and an optional one is for another system', async () => {
    expect(await packagesAreCurrent(root)).toBe(true)
  })

  it('yes: the lock asks for another version', async () => {
    await writePackages('package-lock.json', { '': {}, 'node_modules/a': { ...here, version: '1.0.1' } })
    expect(await packagesAreCurrent(root)).toBe(false)
  })

  it('yes: the lock asks for one more', async () => {
    await writePackages('package-lock.json', { '': {}, 'node_modules/a': here, 'node_modules/c': here })
    expect(await packagesAreCurrent(root)).toBe(false)
  })

  it('yes: the last installation was cut short', async () => {
    await rm(path.join(root, 'node_modules/.package-lock.json'))
    expect(await packagesAreCurrent(root)).toBe(false)
  })

  it('yes: a package was emptied since', async () => {
    await rm(path.join(root, 'node_modules/a/package.json'))
    expect(await packagesAreCurrent(root)).toBe(false)
  })
})
