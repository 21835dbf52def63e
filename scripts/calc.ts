// `npm run --silent calc -- NAME 'JSON'`: one calculation, by the product's own functions. `--lines`: many, a line each.
import { createInterface } from 'node:readline'

import { answerLine, answerText } from '@/scripts/calc/answer'
import { Refusal } from '@/scripts/calc/command'

const usage = `Usage: npm run --silent calc -- NAME 'JSON', or --lines with {"name": …, "input": {…}} on each line.`

async function answerLines() {
  for await (const line of createInterface({ input: process.stdin })) {
    if (line.trim() !== '') console.log(JSON.stringify(resultOrError(line)))
  }
}

function resultOrError(line: string): object {
  try {
    return answerLine(line)
  } catch (error) {
    return { error: sentenceOf(error) }
  }
}

function answerOne(name: string | undefined, text: string | undefined) {
  try {
    if (name === undefined || text === undefined) throw new Refusal(usage)
    console.log(JSON.stringify(answerText(name, text)))
  } catch (error) {
    console.error(sentenceOf(error))
    process.exitCode = 2
  }
}

function sentenceOf(error: unknown): string {
  if (error instanceof Refusal) return error.message
  throw error
}

const [name, text, ...rest] = process.argv.slice(2)
if (name === '--lines' && text === undefined) void answerLines()
else answerOne(name, rest.length > 0 ? undefined : text)
