import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs'

/** What a PDF says, page by page, as one line each. */
export async function pdfWords(bytes: Uint8Array): Promise<string[]> {
  const file = await getDocument({ data: Uint8Array.from(bytes), verbosity: 0 }).promise
  return Promise.all(
    Array.from({ length: file.numPages }, async (_, at) => {
      const { items } = await (await file.getPage(at + 1)).getTextContent()
      return items
        .map((item) => ('str' in item ? item.str : ''))
        .join(' ')
        .replace(/\s+/g, ' ')
    }),
  )
}
