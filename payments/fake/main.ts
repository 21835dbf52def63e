import { readSettings } from './settings'
import { startFake } from './start-fake'

const settings = readSettings(process.argv.slice(2), process.env)
const fake = await startFake(settings)
const stop = () => void fake.stop().then(() => process.exit(0))
process.once('SIGTERM', stop)
process.once('SIGINT', stop)

console.log(`practice card processor listening on ${fake.origin} (books in ${settings.booksFolder})`)
