let armed: string | undefined

/** Names the one place at which this process is to die; said once at start, never in production (server/env.ts). */
export function armFailPoint(name: string | undefined): void {
  armed = name
}

/** Dies here, as by a power cut, when the proof of crash safety has armed this place. */
export function failPoint(name: string): void {
  if (name === armed) process.kill(process.pid, 'SIGKILL')
}
