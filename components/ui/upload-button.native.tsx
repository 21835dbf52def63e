import { launchImageLibraryAsync, type ImagePickerAsset } from 'expo-image-picker'

import { Button } from './button'

import type { ButtonKind } from './button-look'
import type { IconName } from './icon-paths'
import type { PickedFile } from './picked-file'

export interface UploadButtonProps {
  label: string
  onPick: (files: PickedFile[]) => void
  accept?: string
  isMany?: boolean
  isBusy?: boolean
  busyLabel?: string
  isDisabled?: boolean
  kind?: ButtonKind
  icon?: IconName
  nativeID?: string
}

// Pictures only: the system's picker for other files is not part of the phone build.
export function UploadButton({
  onPick,
  accept,
  isMany,
  kind = 'secondary',
  icon = 'camera',
  ...button
}: UploadButtonProps) {
  const mayPick = !accept || accept.startsWith('image/')
  async function pick() {
    const picked = await launchImageLibraryAsync({ mediaTypes: 'images', allowsMultipleSelection: isMany })
    if (!picked.canceled) onPick(await Promise.all(picked.assets.map(describe)))
  }
  return (
    <Button
      {...button}
      kind={kind}
      icon={icon}
      isDisabled={button.isDisabled || !mayPick}
      onPress={() => void pick()}
    />
  )
}

async function describe(asset: ImagePickerAsset): Promise<PickedFile> {
  const body = await (await fetch(asset.uri)).blob()
  return {
    name: asset.fileName ?? 'photo.jpg',
    mime: asset.mimeType ?? body.type,
    sizeBytes: asset.fileSize ?? body.size,
    uri: asset.uri,
    body,
  }
}
