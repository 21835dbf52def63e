import Svg, { Path } from 'react-native-svg'

import { iconPaths, type IconName } from './icon-paths'

import { color, type ColorName } from '@/constants/theme'

interface Props {
  name: IconName
  sizePx?: number
  tint?: ColorName
  isFilled?: boolean
}

export function Icon({ name, sizePx = 24, tint = 'ink', isFilled = false }: Props) {
  const pen = color[tint]
  return (
    <Svg width={sizePx} height={sizePx} viewBox="0 0 24 24" aria-hidden>
      {iconPaths[name].map((path) => (
        <Path
          key={path}
          d={path.replace('*', '')}
          fill={isFilled || path.startsWith('*') ? pen : 'none'}
          stroke={pen}
          strokeWidth={2}
          strokeLinecap="round"
          strokeLinejoin="round"
        />
      ))}
    </Svg>
  )
}
