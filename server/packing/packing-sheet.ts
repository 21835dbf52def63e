import PdfPage from 'pdfkit'

import { labelText } from '@/shared/domain/shipping/label-text'
import type { PackingSheet } from '@/shared/domain/transport/packing-sheet'

const MARGIN_PT = 54
const LABEL_PAD_PT = 10

/** One label for one box, on a page of its own. */
export interface BoxLabel {
  heading: string
  lines: readonly string[]
  /** Under the label, for whoever packs. */
  note: string
}

/** A packing sheet as a Letter page, black on white; with labels of their own, one more page for each box. */
export function renderPackingSheet(
  { title, sections, label }: PackingSheet,
  labels: readonly BoxLabel[] = [],
): Promise<Uint8Array<ArrayBuffer>> {
  const page = new PdfPage({
    size: 'LETTER',
    margin: MARGIN_PT,
    info: { Title: title, Creator: 'Tankward' },
  })
  const done = bytesOf(page)
  page.fillColor('#000').font('Helvetica-Bold').fontSize(16).text(labelText(title))
  for (const { heading, lines } of sections) {
    page.moveDown(0.5).font('Helvetica-Bold').fontSize(11).text(labelText(heading))
    page.font('Helvetica').fontSize(9.5)
    for (const line of lines) page.text(labelText(`- ${line}`), { lineGap: 1 })
  }
  if (labels.length === 0) drawLabel(page, label)
  for (const one of labels) drawBoxLabel(page, one)
  page.end()
  return done
}

/** To be cut out and stuck on the box. */
function drawLabel(page: PdfPage, label: readonly string[]) {
  const width = page.page.width - 2 * MARGIN_PT
  page.moveDown(0.8).font('Helvetica-Bold').fontSize(11).text('Label for each box: cut out')
  page.moveDown(0.3).fontSize(12)
  const text = label.map(labelText).join('\n')
  const height = page.heightOfString(text, { width: width - 2 * LABEL_PAD_PT }) + 2 * LABEL_PAD_PT
  if (page.y + height > page.page.height - MARGIN_PT) page.addPage()
  const top = page.y
  page.lineWidth(1).strokeColor('#000').rect(MARGIN_PT, top, width, height).stroke()
  page.text(text, MARGIN_PT + LABEL_PAD_PT, top + LABEL_PAD_PT, { width: width - 2 * LABEL_PAD_PT })
}

function drawBoxLabel(page: PdfPage, { heading, lines, note }: BoxLabel) {
  page.addPage()
  const width = page.page.width - 2 * MARGIN_PT
  const inside = { width: width - 2 * LABEL_PAD_PT, lineGap: 3 }
  const top = page.y
  page.font('Helvetica-Bold').fontSize(22)
  page.text(heading, MARGIN_PT + LABEL_PAD_PT, top + LABEL_PAD_PT, inside)
  page.fontSize(15)
  for (const line of lines) page.text(labelText(line), inside)
  const height = page.y - top + LABEL_PAD_PT
  page.lineWidth(1).strokeColor('#000').rect(MARGIN_PT, top, width, height).stroke()
  page.font('Helvetica').fontSize(9.5)
  page.text(note, MARGIN_PT, top + height + LABEL_PAD_PT, { width })
}

function bytesOf(page: PdfPage): Promise<Uint8Array<ArrayBuffer>> {
  return new Promise((resolve, reject) => {
    const chunks: Buffer[] = []
    page
      .on('data', (chunk) => chunks.push(chunk))
      .on('end', () => resolve(new Uint8Array(Buffer.concat(chunks))))
      .on('error', reject)
  })
}
