// TIFF inside EXIF (JEITA CP-3451): an IFD is a count of 12-byte entries, tag, type, count, value or its offset.
const DATE_TIME = 0x0132
const EXIF_IFD = 0x8769
const DATE_TIME_ORIGINAL = 0x9003
const DATE_TIME_DIGITISED = 0x9004
const ENTRY_BYTES = 12

interface Tiff {
  bytes: Buffer
  u16: (at: number) => number
  u32: (at: number) => number
}

function openTiff(exif: Buffer): Tiff | null {
  const bytes = exif.subarray(0, 6).toString('latin1') === 'Exif\0\0' ? exif.subarray(6) : exif
  const order = bytes.subarray(0, 2).toString('latin1')
  if (order !== 'II' && order !== 'MM') return null
  const isLittle = order === 'II'
  return {
    bytes,
    u16: (at) => (isLittle ? bytes.readUInt16LE(at) : bytes.readUInt16BE(at)),
    u32: (at) => (isLittle ? bytes.readUInt32LE(at) : bytes.readUInt32BE(at)),
  }
}

/** Where each tag's entry of one IFD begins. */
function entriesOf(tiff: Tiff, ifdAt: number): Map<number, number> {
  const entries = new Map<number, number>()
  const count = tiff.u16(ifdAt)
  for (let n = 0; n < count; n++) {
    const at = ifdAt + 2 + n * ENTRY_BYTES
    entries.set(tiff.u16(at), at)
  }
  return entries
}

function dayAt(tiff: Tiff, entryAt: number | undefined): string | null {
  if (entryAt === undefined) return null
  const textAt = tiff.u32(entryAt + 8)
  const parts = /^(\d{4}):(\d{2}):(\d{2})/.exec(tiff.bytes.subarray(textAt, textAt + 10).toString('latin1'))
  if (!parts) return null
  const day = `${parts[1]}-${parts[2]}-${parts[3]}`
  const read = new Date(`${day}T00:00:00Z`)
  return !Number.isNaN(read.getTime()) && read.toISOString().startsWith(day) ? day : null
}

/** The day a photo was taken by the camera's own clock; null when it does not say so readably. */
export function readExifDate(exif: Buffer | undefined): string | null {
  if (!exif) return null
  try {
    const tiff = openTiff(exif)
    if (!tiff) return null
    const first = entriesOf(tiff, tiff.u32(4))
    const deeper = first.get(EXIF_IFD)
    const inner = deeper === undefined ? new Map<number, number>() : entriesOf(tiff, tiff.u32(deeper + 8))
    return (
      dayAt(tiff, inner.get(DATE_TIME_ORIGINAL)) ??
      dayAt(tiff, inner.get(DATE_TIME_DIGITISED)) ??
      dayAt(tiff, first.get(DATE_TIME))
    )
  } catch (error) {
    // An offset that leads outside the block: whoever wrote it, it tells us nothing.
    if (error instanceof RangeError) return null
    throw error
  }
}
