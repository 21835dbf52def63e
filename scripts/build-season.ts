// `npm run season:build` writes the season table with the trip engine; `-- --check` says whether it is up to date.
import { readFileSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { format, resolveConfig } from 'prettier'

import { tableText } from '@/scripts/season/build-table'

const target = path.resolve('shared/domain/season/season-table.gen.ts')

async function build() {
  const began = performance.now()
  const options = await resolveConfig(target)
  const text = await format(tableText(), { ...options, filepath: target })
  const seconds = ((performance.now() - began) / 1000).toFixed(0)
  if (!process.argv.includes('--check')) {
    writeFileSync(target, text)
    console.log(`Season table written: ${(text.length / 1000).toFixed(0)} kB in ${seconds} s.`)
  } else if (readFileSync(target, 'utf8') !== text) {
    console.error('shared/domain/season/season-table.gen.ts is out of step: run npm run season:build')
    process.exitCode = 1
  } else console.log(`The season table is up to date (${seconds} s).`)
}

void build()
