// `npm run check:native`: the phone apps are still buildable, with their own map; the web app carries none of it.
import { readdir, readFile, rename, rm, writeFile } from 'node:fs/promises'
import path from 'node:path'

import { makeCrew } from './crew.mjs'
import { exportWeb, hashOfWeb } from './export-web.mjs'
import { sentenceOf } from './fault.mjs'
import { plainEnvironment } from './plain-environment.mjs'
import { DATA, ROOT } from './project-root.mjs'
import { step } from './tell.mjs'
import { writeReport } from './write-report.mjs'

const NATIVE = path.join(DATA, 'native')
// The native views' names of react-native-maps: looked up by text at run time, so they outlive minifying.
const NATIVE_MAP = /RNMapsMapView|AIRMapMarker|AIRMap\b/

/** @param {import('./crew.mjs').Crew} crew */
async function exportAndroid(crew) {
  const hash = await hashOfWeb()
  const stamp = path.join(NATIVE, '.made-from')
  if ((await readFile(stamp, 'utf8').catch(() => null)) === hash) return
  const half = `${NATIVE}-${process.pid}`
  const command = ['node', 'node_modules/expo/bin/cli', 'export', '-p', 'android', '--no-bytecode']
  try {
    await crew.run({
      name: 'android export',
      command: [...command, '--output-dir', half],
      environment: { ...plainEnvironment(), CI: '1', EXPO_NO_TELEMETRY: '1', NODE_ENV: 'production' },
    })
    await writeFile(path.join(half, '.made-from'), hash)
    await rm(NATIVE, { recursive: true, force: true })
    await rename(half, NATIVE)
  } finally {
    await rm(half, { recursive: true, force: true })
  }
}

/** All the code of an export as one text. @param {string} folder */
async function codeOf(folder) {
  const entries = await readdir(path.join(folder, '_expo/static/js'), {
    withFileTypes: true,
    recursive: true,
  })
  const files = entries.filter((entry) => entry.isFile() && /\.(?:js|hbc|bundle)$/.test(entry.name))
  const texts = await Promise.all(
    files.map((entry) => readFile(path.join(entry.parentPath, entry.name), 'utf8')),
  )
  return texts.join('\n')
}

try {
  const crew = makeCrew(path.join(DATA, 'logs'))
  await step('Web app', () => exportWeb(crew))
  await step('Android app', () => exportAndroid(crew))
  const [web, android] = await Promise.all([codeOf(path.join(ROOT, 'dist')), codeOf(NATIVE)])
  if (process.argv.includes('--plant-fault')) {
    // Each export in the other's place: both halves of the check have to object.
    process.exitCode = NATIVE_MAP.test(android) && !NATIVE_MAP.test(web) ? 1 : 0
  } else {
    const inAndroid = NATIVE_MAP.test(android)
    const inWeb = NATIVE_MAP.test(web)
    await writeReport({ id: 'native-map-in-android', figure: inAndroid ? 1 : 0, bar: 1, pass: inAndroid })
    await writeReport({ id: 'native-map-in-web', figure: inWeb ? 1 : 0, bar: 0, pass: !inWeb })
    if (!inAndroid || inWeb) process.exitCode = 1
  }
} catch (error) {
  console.error(sentenceOf(error))
  process.exitCode = 2
}
