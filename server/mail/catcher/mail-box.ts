import { randomBytes } from 'node:crypto'
import { mkdir, readdir, readFile, rename, rm, writeFile } from 'node:fs/promises'
import path from 'node:path'

import { simpleParser } from 'mailparser'

import { readMail, type Mail } from './mail'

export interface MailBox {
  add: (raw: Buffer, envelope: { from: string; to: string[] }) => Promise<void>
  /** Newest first. */
  list: (wanted: { to?: string; atMost?: number }) => Promise<Mail[]>
  find: (id: string) => Promise<Mail | null>
  raw: (id: string) => Promise<Buffer | null>
  count: () => number
  clear: () => Promise<void>
}

const ENDING = '.eml'

/** Each mail is a file, so a restart loses none; a file is read once, when somebody first asks for it. */
export async function openMailBox(folder: string): Promise<MailBox> {
  await mkdir(folder, { recursive: true })
  const names = (await readdir(folder)).filter((name) => name.endsWith(ENDING)).sort()
  let ids = names.map((name) => name.slice(0, -ENDING.length))
  const read = new Map<string, Promise<Mail>>()
  const fileOf = (id: string) => path.join(folder, `${id}${ENDING}`)

  async function parse(id: string): Promise<Mail> {
    return readMail(id, await simpleParser(await readFile(fileOf(id))))
  }
  function mailOf(id: string): Promise<Mail> {
    const known = read.get(id) ?? parse(id)
    read.set(id, known)
    return known
  }

  return {
    async add(raw, { from, to }) {
      const id = `${Date.now()}-${randomBytes(4).toString('hex')}`
      const envelope = `Return-Path: <${from}>\r\nX-Envelope-To: ${to.join(', ')}\r\n`
      // Under another name first: a reader never meets half a mail.
      await writeFile(`${fileOf(id)}.part`, Buffer.concat([Buffer.from(envelope), raw]))
      await rename(`${fileOf(id)}.part`, fileOf(id))
      ids.push(id)
    },
    async list({ to, atMost = Infinity }) {
      const newestFirst = ids.toReversed()
      if (to === undefined) return Promise.all(newestFirst.slice(0, atMost).map(mailOf))
      const all = await Promise.all(newestFirst.map(mailOf))
      return all.filter((mail) => mail.to.includes(to.toLowerCase())).slice(0, atMost)
    },
    find: async (id) => (ids.includes(id) ? mailOf(id) : null),
    raw: async (id) => (ids.includes(id) ? readFile(fileOf(id)) : null),
    count: () => ids.length,
    async clear() {
      const gone = ids
      ids = []
      read.clear()
      await Promise.all(gone.map((id) => rm(fileOf(id), { force: true })))
    },
  }
}
