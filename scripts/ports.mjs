import { readFile, writeFile } from 'node:fs/promises'
import { createServer } from 'node:net'
import path from 'node:path'

/** The port that was got on loopback; null when it is taken or not ours to take. @param {number} wanted 0: any */
export function tryPort(wanted) {
  return /** @type {Promise<number | null>} */ (
    new Promise((done) => {
      const probe = createServer()
      probe.once('error', () => done(null))
      probe.listen({ port: wanted, host: '127.0.0.1', exclusive: true }, () => {
        const at = probe.address()
        probe.close(() => done(at && typeof at === 'object' ? at.port : null))
      })
    })
  )
}

/** @param {number} wanted @returns {Promise<number>} that port when it is free, else any other */
async function thisOrAny(wanted) {
  const got = (await tryPort(wanted)) ?? (await tryPort(0))
  if (got === null) throw new Error('no free port on 127.0.0.1')
  return got
}

/**
 * Ports for the programs beside the server. They stay the same from start to start while they are free, so
 * that an open mail page or a bookmarked payment page goes on working.
 * @param {string} dataDir
 * @param {{ smtp: number, mail: number, pay: number, weather: number }} first what to try at the first start
 */
export async function rememberedPorts(dataDir, first) {
  const file = path.join(dataDir, 'ports.json')
  const kept = await readFile(file, 'utf8').then(JSON.parse, () => ({}))
  const wanted = { ...first, ...kept }
  const ports = {
    smtp: await thisOrAny(wanted.smtp),
    mail: await thisOrAny(wanted.mail),
    pay: await thisOrAny(wanted.pay),
    weather: await thisOrAny(wanted.weather),
  }
  await writeFile(file, JSON.stringify(ports))
  return ports
}
