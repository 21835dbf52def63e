import { readdir, readFile } from 'node:fs/promises'
import path from 'node:path'
import { promisify } from 'node:util'
import { brotliCompress, constants } from 'node:zlib'

const brotli = promisify(brotliCompress)
// Names that zod looks up at run time, so that no minifier may touch them.
const ZOD = /"Zod(?:String|Object|Error)"|\$ZodType/

/** @param {Buffer | string} bytes */
async function brotliBytes(bytes) {
  const params = { [constants.BROTLI_PARAM_QUALITY]: 11 }
  return (await brotli(bytes, { params })).length
}

/** @param {string} html @param {RegExp} tag */
const placesIn = (html, tag) => [...html.matchAll(tag)].map((found) => found[1] ?? '')

/** @param {{ bytes: number }[]} files */
const sum = (files) => files.reduce((bytes, file) => bytes + file.bytes, 0)

/**
 * What a first visit loads: bytes after brotli (fonts as they are, being compressed already).
 * @param {string} dist
 */
export async function measureWeb(dist) {
  const html = await readFile(path.join(dist, 'index.html'), 'utf8')
  const scripts = placesIn(html, /<script[^>]*\ssrc="([^"]+)"/g)
  const styles = placesIn(html, /<link rel="stylesheet" href="([^"]+)"/g)
  const fonts = placesIn(html, /<link\s+rel="preload"\s+href="([^"]+\.woff2)"/g)
  const read = (/** @type {string} */ place) => readFile(path.join(dist, place))

  const entry = await Promise.all(
    scripts.map(async (place) => {
      const text = await read(place)
      return { place, bytes: await brotliBytes(text), hasZod: ZOD.test(text.toString()) }
    }),
  )
  const chunks = await readdir(path.join(dist, '_expo/static/js/web'))
  const later = await Promise.all(
    chunks
      .map((name) => `/_expo/static/js/web/${name}`)
      .filter((place) => place.endsWith('.js') && !scripts.includes(place))
      .map(async (place) => {
        const text = await read(place)
        return { place, bytes: await brotliBytes(text), hasZod: ZOD.test(text.toString()) }
      }),
  )
  const fontBytes = await Promise.all(fonts.map(async (place) => ({ bytes: (await read(place)).length })))
  const beside = await Promise.all(
    [html, ...(await Promise.all(styles.map(read)))].map(async (text) => ({
      bytes: await brotliBytes(text),
    })),
  )
  return {
    entry,
    later,
    entryBytes: sum(entry),
    fontBytes: sum(fontBytes),
    totalBytes: sum(entry) + sum(fontBytes) + sum(beside),
  }
}
