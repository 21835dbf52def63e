import { escapeHtml } from '@/server/mail/escape-html'
import type { Letter, LetterBlock } from '@/server/mail/letter'

// Mail programs know no style sheets worth trusting: the colours of the house stand beside each element.
const INK = '#141B34'
const MUTED = '#434C68'
const NETTING = '#2A3579'
const SUNK = '#E4E9F1'
const FONT = "font-family:'Atkinson Hyperlegible Next',Verdana,sans-serif"

function tagHtml(tag: Extract<LetterBlock, { kind: 'tag' }>): string {
  const cell = `padding:12px 16px;${FONT};color:${INK}`
  return `<table role="presentation" cellpadding="0" cellspacing="0" width="100%" style="border:1px solid ${MUTED};border-radius:4px;margin:0 0 16px"><tr><td style="${cell}"><span style="display:inline-block;width:12px;height:12px;border:1px solid ${MUTED};border-radius:50%"></span><br><strong style="font-size:20px">${escapeHtml(tag.title)}</strong><br><span style="font-size:17px">${escapeHtml(tag.size)}</span><br><span style="color:${MUTED}">${escapeHtml(tag.count)}</span></td><td align="right" style="${cell};border-left:2px dashed ${MUTED}"><strong style="font-size:20px">${escapeHtml(tag.price)}</strong><br><span style="color:${MUTED}">${escapeHtml(tag.place)}</span></td></tr></table>`
}

function blockHtml(block: LetterBlock): string {
  switch (block.kind) {
    case 'text':
      return `<p style="margin:0 0 16px;${FONT};font-size:16px;line-height:1.5;color:${INK}">${escapeHtml(block.text)}</p>`
    case 'caution':
      return `<p style="margin:0 0 16px;padding:12px 16px;background:${SUNK};${FONT};font-size:15px;line-height:1.5;color:${INK}"><strong>Please note. </strong>${escapeHtml(block.text)}</p>`
    case 'facts':
      return `<table role="presentation" cellpadding="0" cellspacing="0" style="margin:0 0 16px">${block.rows
        .map(
          ([name, value]) =>
            `<tr><td style="padding:4px 16px 4px 0;${FONT};font-size:15px;color:${MUTED};vertical-align:top">${escapeHtml(name)}</td><td style="padding:4px 0;${FONT};font-size:15px;color:${INK}">${escapeHtml(value)}</td></tr>`,
        )
        .join('')}</table>`
    case 'button':
      return `<p style="margin:0 0 16px"><a href="${escapeHtml(block.url)}" style="display:inline-block;padding:14px 20px;background:${NETTING};color:#FFFFFF;border-radius:4px;text-decoration:none;${FONT};font-size:16px">${escapeHtml(block.label)}</a></p>`
    case 'code':
      return `<p style="margin:0 0 16px;${FONT};color:${INK}">${escapeHtml(block.label)}<br><strong style="font-size:28px;letter-spacing:4px">${escapeHtml(block.code)}</strong></p>`
    case 'tag':
      return tagHtml(block)
  }
}

function blockText(block: LetterBlock): string {
  switch (block.kind) {
    case 'text':
      return block.text
    case 'caution':
      return `Please note: ${block.text}`
    case 'facts':
      return block.rows.map(([name, value]) => `${name}: ${value}`).join('\n')
    case 'button':
      return `${block.label}:\n${block.url}`
    case 'code':
      return `${block.label}: ${block.code}`
    case 'tag':
      return [block.title, block.size, block.count, block.price, block.place].filter(Boolean).join(' · ')
  }
}

/**
 * Both faces of a mail from the same blocks; the plain part is complete on its own. `leaveUrl` stands under what a
 * member may switch off.
 */
export function renderLetter(letter: Letter, leaveUrl?: string): { html: string; text: string } {
  const leaveHtml = leaveUrl
    ? `<br><a href="${escapeHtml(leaveUrl)}" style="color:${MUTED}">Stop these reminders</a>`
    : ''
  const leaveText = leaveUrl ? `\nStop these reminders: ${leaveUrl}` : ''
  const foot = 'Tankward: fish, worms and greens from growers near you.'
  const html = `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1"><title>${escapeHtml(letter.subject)}</title></head><body style="margin:0;padding:24px 16px;background:#F1F4F8"><main style="max-width:560px;margin:0 auto;padding:24px;background:#FFFFFF"><h1 style="margin:0 0 16px;${FONT};font-size:24px;line-height:1.25;color:${INK}">${escapeHtml(letter.heading)}</h1>${letter.blocks.map(blockHtml).join('')}<p style="margin:24px 0 0;${FONT};font-size:13px;color:${MUTED}">${foot}${leaveHtml}</p></main></body></html>`
  const text = `${letter.heading}\n\n${letter.blocks.map(blockText).join('\n\n')}\n\n${foot}${leaveText}\n`
  return { html, text }
}
