declare module 'subset-font' {
  /** Keeps only the glyphs of `text`; answers the font file in the format asked for. */
  export default function subsetFont(
    font: Buffer,
    text: string,
    options?: {
      targetFormat?: 'woff2' | 'woff' | 'sfnt' | 'truetype'
      variationAxes?: Record<string, unknown>
    },
  ): Promise<Buffer>
}
