// The part of pdfkit that we use: the package ships no types.
declare module 'pdfkit' {
  interface TextOptions {
    align?: 'left' | 'center'
    width?: number
    indent?: number
    continued?: boolean
    lineGap?: number
  }
  interface DocumentOptions {
    size: 'LETTER'
    margin: number
    info: Record<string, string | Date>
    compress?: boolean
    bufferPages?: boolean
  }
  export default class PdfPage {
    constructor(options: DocumentOptions)
    readonly page: { width: number; height: number; margins: { left: number; right: number; bottom: number } }
    x: number
    y: number
    on(event: 'data', take: (chunk: Buffer) => void): this
    on(event: 'end', done: () => void): this
    on(event: 'error', failed: (error: Error) => void): this
    font(name: 'Helvetica' | 'Helvetica-Bold'): this
    fontSize(points: number): this
    fillColor(colour: string): this
    strokeColor(colour: string): this
    lineWidth(points: number): this
    text(text: string, options?: TextOptions): this
    text(text: string, x: number, y: number, options?: TextOptions): this
    heightOfString(text: string, options?: TextOptions): number
    moveDown(lines?: number): this
    rect(x: number, y: number, width: number, height: number): this
    stroke(): this
    addPage(): this
    end(): void
  }
}
