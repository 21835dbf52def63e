import { useRef } from 'react'
import { View } from 'react-native'

import { Button } from './button'
import { webElement } from './web-element'

import type { ButtonKind } from './button-look'
import type { IconName } from './icon-paths'
import type { PickedFile } from './picked-file'
import type { ChangeEvent } from 'react'

export interface UploadButtonProps {
  label: string
  onPick: (files: PickedFile[]) => void
  /** As the browser's accept list; pictures when absent. */
  accept?: string
  isMany?: boolean
  isBusy?: boolean
  busyLabel?: string
  isDisabled?: boolean
  kind?: ButtonKind
  icon?: IconName
  nativeID?: string
}

const pictures = 'image/jpeg,image/png,image/webp'

export function UploadButton(props: UploadButtonProps) {
  const { onPick, accept = pictures, isMany, kind = 'secondary', icon = 'camera', ...button } = props
  const input = useRef<HTMLInputElement>(null)
  return (
    <View>
      <Button {...button} kind={kind} icon={icon} onPress={() => input.current?.click()} />
      {webElement('input', {
        ref: input,
        type: 'file',
        accept,
        multiple: isMany,
        hidden: true,
        onChange: (event: ChangeEvent<HTMLInputElement>) => {
          onPick(Array.from(event.target.files ?? [], describe))
          event.target.value = '' // the same file may be picked again after a failure
        },
      })}
    </View>
  )
}

function describe(file: File): PickedFile {
  return {
    name: file.name,
    mime: file.type,
    sizeBytes: file.size,
    uri: URL.createObjectURL(file),
    body: file,
  }
}
