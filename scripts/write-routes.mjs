// Writes shared/api/routes.gen.ts: the small table of method and path that the browser carries in place of zod.
import { readFileSync, readdirSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { register } from 'tsx/esm/api'

register()
const root = path.resolve(import.meta.dirname, '..')
const folder = path.join(root, 'shared/contracts')
const target = path.join(root, 'shared/api/routes.gen.ts')

const types = []
const rows = []
for (const file of readdirSync(folder).sort()) {
  if (!file.endsWith('.ts') || file.endsWith('.test.ts')) continue
  const noun = file.replace(/\.ts$/, '')
  const contract = await import(path.join(folder, file))
  for (const [name, value] of Object.entries(contract).sort(([a], [b]) => (a < b ? -1 : 1))) {
    if (value?.kind !== 'endpoint') continue
    rows.push(`  ${name}: ['${value.method}', '${value.path}', ${value.upload === true}],`)
    types.push(`  ${name}: typeof import('@/shared/contracts/${noun}').${name}`)
  }
}
const text = `// Written by scripts/write-routes.mjs from shared/contracts; the contract test fails when it is out of step.
export interface Endpoints {
${types.join('\n')}
}

export const routes: Record<keyof Endpoints, readonly [method: string, path: string, upload: boolean]> = {
${rows.join('\n')}
}
`
if (process.argv.includes('--check')) {
  if (readFileSync(target, 'utf8') !== text) {
    console.error('shared/api/routes.gen.ts is out of step: run npm run routes')
    process.exit(1)
  }
} else writeFileSync(target, text)
