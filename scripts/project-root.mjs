import path from 'node:path'

export const ROOT = path.resolve(import.meta.dirname, '..')
export const DATA = path.join(ROOT, '.data')
