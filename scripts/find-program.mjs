import { constants } from 'node:fs'
import { access } from 'node:fs/promises'
import path from 'node:path'

// An ordinary user's PATH often lacks /usr/sbin, where Debian keeps mariadbd.
const MORE_FOLDERS = ['/usr/sbin', '/usr/bin', '/usr/local/bin', '/opt/homebrew/bin']

/** The first of these programs that may be run here; null when none is installed. @param {string[]} names */
export async function findProgram(names) {
  const folders = [...(process.env.PATH ?? '').split(path.delimiter).filter(Boolean), ...MORE_FOLDERS]
  for (const name of names) {
    for (const folder of folders) {
      const file = path.join(folder, name)
      const runs = await access(file, constants.X_OK).then(
        () => true,
        () => false,
      )
      if (runs) return file
    }
  }
  return null
}

export const findChromium = () =>
  findProgram(['chromium', 'chromium-browser', 'google-chrome', 'google-chrome-stable'])
