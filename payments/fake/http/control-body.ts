/** The JSON body of a control call; every field is read with the type it must have. */
export class ControlBody {
  private readonly fields: Record<string, unknown>

  constructor(text: string) {
    const read: unknown = text === '' ? {} : JSON.parse(text)
    if (typeof read !== 'object' || read === null) throw new Error('a control call carries a JSON object')
    this.fields = { ...read }
  }

  number(name: string, fallback?: number): number {
    const value = this.fields[name] ?? fallback
    if (typeof value !== 'number' || !Number.isFinite(value)) throw new Error(`"${name}" must be a number`)
    return value
  }

  text(name: string, fallback?: string): string {
    const value = this.fields[name] ?? fallback
    if (typeof value !== 'string') throw new Error(`"${name}" must be a text`)
    return value
  }

  choice<T extends string>(name: string, allowed: readonly T[]): T {
    const value = this.text(name)
    const found = allowed.find((one) => one === value)
    if (!found) throw new Error(`"${name}" must be one of ${allowed.join(', ')}`)
    return found
  }

  /** Null when it is not given. */
  flag(name: string): boolean | null {
    const value = this.fields[name]
    if (value === undefined) return null
    if (typeof value !== 'boolean') throw new Error(`"${name}" must be true or false`)
    return value
  }
}
