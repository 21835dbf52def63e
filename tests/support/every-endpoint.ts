import { readdirSync } from 'node:fs'
import path from 'node:path'

import type { Endpoint } from '@/shared/api/endpoint'

const folder = path.resolve(import.meta.dirname, '../../shared/contracts')

/** Every endpoint that the contracts export, by its name. */
export async function everyEndpoint(): Promise<[name: string, endpoint: Endpoint][]> {
  const found: [string, Endpoint][] = []
  for (const file of readdirSync(folder)) {
    if (!file.endsWith('.ts') || file.endsWith('.test.ts')) continue
    const contract = (await import(path.join(folder, file))) as Record<string, unknown>
    for (const [name, value] of Object.entries(contract)) {
      if (typeof value === 'object' && value !== null && 'kind' in value && value.kind === 'endpoint') {
        found.push([name, value as Endpoint])
      }
    }
  }
  return found
}
