import { Field, type FieldProps } from './field'

/** Takes free text ("2 1/4 in", "72 F", "1,200"): reading it is the caller's work (shared/units). */
export function NumberField(props: FieldProps) {
  return (
    <Field
      inputMode={props.inputMode ?? 'text'}
      autoCapitalize="none"
      autoComplete="off"
      spellCheck={false}
      {...props}
    />
  )
}
