import { spawn } from 'node:child_process'
import { closeSync, mkdirSync, openSync } from 'node:fs'
import path from 'node:path'

import { explainFailure } from './explain-failure.mjs'
import { Fault } from './fault.mjs'
import { lastWords } from './last-words.mjs'
import { pause } from './mariadb-leftover.mjs'
import { ROOT } from './project-root.mjs'

const LONGEST_COMING_MS = 6_000

/**
 * @typedef {object} Task
 * @property {string} name shown to people, and the name of its log
 * @property {string[]} command program and arguments; "node" means this very Node
 * @property {Record<string, string | undefined>} [environment]
 * @property {number} [graceMs] how long it may take to end after SIGTERM
 * @property {boolean} [shown] true: it speaks to the person, not to a log
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

/** Nothing to do when it has gone already. @param {number} pid @param {NodeJS.Signals} signal */
function signalTo(pid, signal) {
  try {
    process.kill(pid, signal)
  } catch (error) {
    if (!(error instanceof Error && 'code' in error && error.code === 'ESRCH')) throw error
  }
}

/** @param {string} log @param {Task} task @returns {Member} */
function launch(log, { name, command, environment, graceMs = 2_000, shown = false }) {
  const [program, ...rest] = command
  mkdirSync(path.dirname(log), { recursive: true })
  const out = shown ? null : openSync(log, 'w')
  // A group of its own: Ctrl-C reaches only the starter, which then stops everything in order.
  const child = spawn(program === 'node' ? process.execPath : (program ?? ''), rest, {
    cwd: ROOT,
    env: environment ?? process.env,
    detached: true,
    stdio: ['ignore', out ?? 'inherit', out ?? 'inherit'],
  })
  if (out !== null) closeSync(out)
  /** @type {Promise<Ending>} */
  const ended = new Promise((done) => {
    child.once('exit', (code, signal) => done({ code, signal }))
    child.once('error', () => done({ code: 127, signal: null }))
  })
  const send = (/** @type {NodeJS.Signals} */ signal) => {
    if (child.pid) signalTo(-child.pid, signal)
  }
  const stop = async () => {
    send('SIGTERM')
    const hard = setTimeout(() => send('SIGKILL'), graceMs)
    await ended
    clearTimeout(hard)
  }
  return { name, pid: child.pid, ended, stop, drop: () => send('SIGTERM'), lastWords: () => lastWords(log) }
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

  const logOf = (/** @type {{ name: string }} */ { name }) =>
    path.join(logs, `${name.replaceAll(' ', '-')}.log`)

  /** @param {Task} task */
  function start(task) {
    if (leaving) throw new Leaving()
    const member = launch(logOf(task), task)
    aboard.push(member)
    void member.ended.then(() => aboard.includes(member) && leave(member))
    return member
  }

  /** @param {Task} task */
  async function finish(task) {
    const ending = await start(task).ended
    if (leaving) throw new Leaving()
    return ending
  }

  /** Runs a program to its end; a failure becomes a sentence. @param {Task} task */
  async function run(task) {
    const { code, signal } = await finish(task)
    if (code === 0) return
    const log = logOf(task)
    const words = await lastWords(log)
    const known = explainFailure(words)
    const how = signal ? `was ended by ${signal}` : `failed (exit code ${code})`
    throw new Fault(
      `${known ? `${known}\n` : ''}${task.name} ${how}. Its last words, from ${path.relative(ROOT, log)}:\n${words}`,
    )
  }

  /**
   * Takes in something that starts and stops by other means, such as the database.
   * @template {{ pid: number, stop: () => Promise<void> }} T
   * @param {Promise<T>} coming
   */
  async function adopt(coming) {
    /** @type {T | null} */
    let made = null
    const member = {
      stop: async () => {
        // A database folder in the making ends by itself and starts nothing: not worth more waiting than this.
        await Promise.race([coming.catch(() => undefined), pause(LONGEST_COMING_MS)])
        await made?.stop()
        leave(member)
      },
      drop: () => made && signalTo(made.pid, 'SIGTERM'),
    }
    aboard.push(member)
    made = await coming
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
  process.once('exit', () => aboard.forEach((member) => member.drop()))

  /** The end of what a program said, also one that succeeded. @param {string} name */
  const wordsOf = (name) => lastWords(logOf({ name }))

  return { start, finish, run, adopt, wordsOf, stopAll, isLeaving: () => leaving !== null }
}

/** @typedef {ReturnType<typeof makeCrew>} Crew */
