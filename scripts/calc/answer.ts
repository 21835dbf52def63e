import { animalCommands } from '@/scripts/calc/animal-commands'
import { climateCommands } from '@/scripts/calc/climate-commands'
import { Refusal } from '@/scripts/calc/command'
import { transportCommands } from '@/scripts/calc/transport-commands'
import { tripCommands } from '@/scripts/calc/trip-commands'
import { waterCommands } from '@/scripts/calc/water-commands'

const commands = new Map(
  [waterCommands, animalCommands, transportCommands, climateCommands, tripCommands].flatMap((group) =>
    Object.entries(group),
  ),
)

/** One calculation by its name. Throws a Refusal with one sentence for whoever asked. */
export function answer(name: string, input: unknown): object {
  const run = commands.get(name)
  if (!run)
    throw new Refusal(`There is no calculation "${name}"; there are ${[...commands.keys()].join(', ')}.`)
  return run(input)
}

/** The same for JSON text. */
export function answerText(name: string, text: string): object {
  return answer(name, parsed(text))
}

/** The same for one line {"name": …, "input": …}. */
export function answerLine(line: string): object {
  const asked = parsed(line)
  const isAsked = typeof asked === 'object' && asked !== null && 'name' in asked && 'input' in asked
  if (!isAsked || typeof asked.name !== 'string') throw new Refusal('A line is {"name": …, "input": {…}}.')
  return answer(asked.name, asked.input)
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text)
  } catch {
    throw new Refusal('The input is not JSON.')
  }
}
