import { randomUUID } from 'node:crypto'
import { mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs'
import { dirname } from 'node:path'

import type { WeatherRule } from './weather'

export const modes = ['normal', 'refuses', 'hangs', 'objects'] as const
/** `refuses`: 500. `hangs`: no answer until the caller leaves. `objects`: 400 with a reason. */
export type Mode = (typeof modes)[number]

export interface WeatherBook {
  /** In the order in which they were set. */
  rules: () => readonly WeatherRule[]
  mode: () => Mode
  add: (rule: Omit<WeatherRule, 'id'>) => WeatherRule
  remove: (id: string) => void
  clear: () => void
  setMode: (mode: Mode) => void
}

interface Written {
  mode: Mode
  rules: WeatherRule[]
}

function readBook(file: string): Written {
  const nothing: Written = { mode: 'normal', rules: [] }
  try {
    const { mode, rules } = JSON.parse(readFileSync(file, 'utf8')) as Partial<Written>
    return { mode: mode ?? nothing.mode, rules: rules ?? nothing.rules }
  } catch (error) {
    if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return nothing
    process.stderr.write(`${file} cannot be read; the weather is mild again everywhere\n`)
    return nothing
  }
}

/** What has been set, kept in a file so that it outlives a restart; null: in memory only. */
export function openWeatherBook(file: string | null): WeatherBook {
  let written: Written = file === null ? { mode: 'normal', rules: [] } : readBook(file)
  const write = (next: Written) => {
    if (file !== null) {
      mkdirSync(dirname(file), { recursive: true })
      // Under another name first: a stop in the middle leaves the old file whole.
      writeFileSync(`${file}.part`, JSON.stringify(next, null, 2))
      renameSync(`${file}.part`, file)
    }
    written = next
  }
  return {
    rules: () => written.rules,
    mode: () => written.mode,
    add(given) {
      const rule = { id: randomUUID(), ...given }
      write({ ...written, rules: [...written.rules, rule] })
      return rule
    },
    remove: (id) => write({ ...written, rules: written.rules.filter((rule) => rule.id !== id) }),
    clear: () => write({ ...written, rules: [] }),
    setMode: (mode) => write({ ...written, mode }),
  }
}
