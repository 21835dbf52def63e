import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import path from 'node:path'

import { afterEach, beforeEach, expect, it } from 'vitest'

import { importCycles } from '@/scripts/import-cycles.mjs'
import { ROOT } from '@/scripts/project-root.mjs'

let root = ''
beforeEach(async () => {
  root = await mkdtemp(path.join(tmpdir(), 'cycles-'))
})
afterEach(() => rm(root, { recursive: true }))

async function cyclesOf(files: Record<string, string>): Promise<string[]> {
  for (const [name, text] of Object.entries(files)) {
    await mkdir(path.dirname(path.join(root, name)), { recursive: true })
    await writeFile(path.join(root, name), text)
  }
  return [...importCycles(root, ['src']).keys()].map((file) => path.relative(root, file)).sort()
}

it('finds every file of a cycle, over both ways of naming a file, and none beside it', async () => {
  const found = await cyclesOf({
    'src/a.ts': "import { b } from './deep/b'\nexport const a = () => b\n",
    'src/deep/b.ts': "import {\n  c,\n} from '@/src/c'\nexport const b = c\n",
    'src/c.tsx': "export { a } from './a'\n",
    'src/apart.ts': "import { a } from '@/src/a'\nexport const apart = a\n",
    'src/self.ts': "import { self } from './self'\nexport { self }\n",
  })
  expect(found).toEqual(['src/a.ts', 'src/c.tsx', 'src/deep/b.ts', 'src/self.ts'])
})

it('lets types and what is loaded later be', async () => {
  const found = await cyclesOf({
    'src/a.ts': "import type { B } from './b'\nexport type A = B\n",
    'src/b.ts': "import type { A } from './a'\nexport type B = A\nexport const later = () => import('./c')\n",
    'src/c.ts': "import { later } from './b'\nexport const c = later\n",
  })
  expect(found).toEqual([])
})

it('finds none in this project', () => {
  expect([...importCycles(ROOT, ['server', 'shared', 'components', 'hooks'])]).toEqual([])
})
