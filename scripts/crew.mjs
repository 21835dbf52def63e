import { spawn } from 'node:child_process'
import { closeSync, mkdirSync, openSync } from 'node:fs'
import { readFile } from 'node:fs/promises'
import path from 'node:path'

import { explainFailure } from './explain-failure.mjs'
import { Fault } from './fault.mjs'
import { ROOT } from './project-root.mjs'

const LAST_WORDS = 12

/**
 * @typedef {object} Task
 * @property {string} name shown to people, and the name of its log
 * @property {string[]} command program and arguments; "node" means this very Node
 * @property {Record<string, string | undefined>} [environment]
 * @property {number} [graceMs] how long it may take to end after SIGTERM
 *
 * @typedef {{ code: number | null, signal: string | null }} Ending
 *
 * @typedef {object} Member
 * @property {string} name
 * @property {number | undefined} pid
 * @property {Promise<Ending>} ended
 * @property {() => Promise<void>} stop
 * @property {() => void} drop asks it to end and does not wait
 * @property {() => Promise<string>} lastWords
 */

/** Thrown by work that was cut short because everything is being stopped. */
export class Leaving extends Error {}

/** @param {string} file */
async function tailOf(file) {
  const text = await readFile(file, 'utf8').catch(() => '')
  return text.trimEnd().split('\n').slice(-LAST_WORDS).join('\n')
}

/** @param {string} log @param {Task} task @returns {Member} */
function launch(log, { name, command, environment, graceMs = 2_000 }) {
  const [program, ...rest] = command
  mkdirSync(path.dirname(log), { recursive: true })
  const out = openSync(log, 'w')
  // A group of its own: Ctrl-C reaches only the starter, which then stops everything in order.
  const child = spawn(program === 'node' ? process.execPath : (program ?? ''), rest, {
    cwd: ROOT,
    env: environment ?? process.env,
    detached: true,
    stdio: ['ignore', out, out],
  })
  closeSync(out)
  /** @type {Promise<Ending>} */
  const ended = new Promise((done) => {
    child.once('exit', (code, signal) => done({ code, signal }))
    child.once('error', () => done({ code: 127, signal: null }))
  })
  /** @param {NodeJS.Signals} signal */
  const send = (signal) => {
    try {
      if (child.pid) process.kill(-child.pid, signal)
    } catch (error) {
      if (!(error instanceof Error && 'code' in error && error.code === 'ESRCH')) throw error
    }
  }
  const stop = async () => {
    send('SIGTERM')
    const hard = setTimeout(() => send('SIGKILL'), graceMs)
    await ended
    clearTimeout(hard)
  }
  return { name, pid: child.pid, ended, stop, drop: () => send('SIGTERM'), lastWords: () => tailOf(log) }
}

/**
 * The programs one start has running. They are stopped last come, first gone.
 * @param {string} logs folder for what they say
 */
export function makeCrew(logs) {
  /** @type {{ stop: () => Promise<void>, drop: () => void }[]} */
  const aboard = []
  /** @type {Promise<void> | null} */
  let leaving = null

  /** @param {typeof aboard[number]} member */
  const leave = (member) => void aboard.splice(aboard.indexOf(member), 1)

  /** @param {Task} task */
  function start(task) {
    if (leaving) throw new Leaving()
    const member = launch(path.join(logs, `${task.name.replaceAll(' ', '-')}.log`), task)
    aboard.push(member)
    void member.ended.then(() => aboard.includes(member) && leave(member))
    return member
  }

  /** Runs a program to its end; a failure becomes a sentence. @param {Task} task */
  async function run(task) {
    const member = start(task)
    const { code, signal } = await member.ended
    if (leaving) throw new Leaving()
    if (code === 0) return
    const words = await member.lastWords()
    const known = explainFailure(words)
    const how = signal ? `was ended by ${signal}` : `failed (exit code ${code})`
    const log = path.relative(ROOT, path.join(logs, `${task.name.replaceAll(' ', '-')}.log`))
    throw new Fault(`${known ? `${known}\n` : ''}${task.name} ${how}. Its last words, from ${log}:\n${words}`)
  }

  /**
   * Takes in something that starts and stops by other means, such as the database.
   * @template {{ pid: number, stop: () => Promise<void> }} T
   * @param {Promise<T>} coming
   */
  async function adopt(coming) {
    let drop = () => {}
    aboard.push({
      stop: () =>
        coming.then(
          (one) => one.stop(),
          () => undefined,
        ),
      drop: () => drop(),
    })
    const made = await coming
    drop = () => void process.kill(made.pid, 'SIGTERM')
    if (leaving) throw new Leaving()
    return made
  }

  async function stopInOrder() {
    const failures = []
    for (const member of aboard.toReversed()) await member.stop().catch((error) => failures.push(error))
    if (failures.length > 0) throw failures[0]
  }
  const stopAll = () => (leaving ??= stopInOrder())
  // The starter ends without having stopped them, as a test run does that was broken off.
  process.once('exit', () => leaving || aboard.forEach((member) => member.drop()))

  return { start, run, adopt, stopAll, isLeaving: () => leaving !== null }
}

/** @typedef {ReturnType<typeof makeCrew>} Crew */
