import { z } from 'zod'

/** What was asked cannot be answered: one sentence for whoever asked. */
export class Refusal extends Error {}

/** One calculation by name: checks what came in, gives one object back, or says why not. */
export type Command = (input: unknown) => object

/** `run` answers null where its source does not reach; then `holdsFor` says where it does. */
export function command<Input>(
  schema: z.ZodType<Input>,
  holdsFor: string,
  run: (input: Input) => object | null,
): Command {
  return (raw) => {
    const read = schema.safeParse(raw)
    if (!read.success) throw new Refusal(sentenceOf(read.error))
    const answer = run(read.data)
    if (answer === null) throw new Refusal(`No answer for these figures; this holds for ${holdsFor}.`)
    return answer
  }
}

function sentenceOf(error: z.ZodError): string {
  const issue = error.issues[0]
  const where = issue?.path.join('.')
  return `${where ? `${where}: ` : ''}${issue?.message ?? 'The input cannot be read'}.`
}

/** A reply of one figure under its name; null stays null. */
export function named<Name extends string>(name: Name, figure: number | null) {
  return figure === null ? null : { [name]: figure }
}
