import type { Href } from 'expo-router'
import type { StyleProp, ViewStyle } from 'react-native'

import { buttonLook, buttonStyles, buttonTint, type ButtonKind } from './button-look'
import { Icon } from './icon'
import { PressLink } from './press-link'
import { Text } from './text'

import type { IconName } from './icon-paths'

interface Props {
  label: string
  href: Href
  kind?: ButtonKind
  icon?: IconName
  isWide?: boolean
  spokenLabel?: string
  style?: StyleProp<ViewStyle>
}

export function ButtonLink({ label, href, kind = 'primary', icon, isWide, spokenLabel, style }: Props) {
  return (
    <PressLink
      href={href}
      label={spokenLabel}
      look={(state) => [...buttonLook(kind, state), isWide ? buttonStyles.wide : null, style]}
    >
      {icon ? <Icon name={icon} sizePx={20} tint={buttonTint[kind]} /> : null}
      <Text face="strong" tint={buttonTint[kind]}>
        {label}
      </Text>
    </PressLink>
  )
}
