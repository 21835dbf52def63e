import { Text } from './text'

interface Props {
  text: string
  controlId: string
  labelId: string
  note?: string
}

export function Label({ text, labelId, note }: Props) {
  return (
    <Text face="strong" nativeID={labelId}>
      {note ? `${text} (${note})` : text}
    </Text>
  )
}
