export interface Choice<Value extends string> {
  value: Value
  label: string
  hint?: string
}
