import { writeReport } from '@/scripts/write-report.mjs'

type Measured = Parameters<typeof writeReport>[0]

/** The part that was run: `npm test` runs slices, `npm run check:…` the whole. */
export const isSlice = process.env.CHECK_PART === 'slice'

/** The seed of a drawn check; CHECK_SEED repeats one. */
export const checkSeed = Number(process.env.CHECK_SEED ?? 20_261_201)

/** Writes a figure beside its bar as one JSON, and prints it as one line. A slice does not overwrite the whole. */
export async function reportFigure(measured: Measured): Promise<void> {
  await writeReport(isSlice ? { ...measured, id: `${measured.id}-slice` } : measured)
  console.log(JSON.stringify({ ...measured, seed: measured.seed ?? null }))
}
